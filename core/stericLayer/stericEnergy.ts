import { BOLTZMANN_J_K } from '../constants';
import { nm_from_m } from '../quantities/convert';
import type { Caveat } from '../validity';
import { mustBePositive } from '../validity';
import { type LayerInput, layerProperties } from './layerProperties';
import { oneSidedOsmoticEnergy } from './oneSidedLayer';
import { elasticEnergy, osmoticEnergy } from './vincent1986';

export interface StericPair {
  readonly radius1_m: number;
  readonly radius2_m: number;
  readonly layer1: LayerInput | null;
  readonly layer2: LayerInput | null;
  readonly solventMolecule_m3: number;
  readonly temperature_K: number;
}

export interface StericLayer {
  readonly energy_J: (separation_m: number) => number;
  /** The dry polymer of both layers: closer the particles cannot come. */
  readonly contact_m: number;
  readonly edges_m: readonly number[];
  readonly caveats: readonly Caveat[];
}

const THICK_AGAINST_RADIUS = 0.2;

function caveatsOf({ radius1_m, radius2_m, layer1, layer2 }: StericPair): Caveat[] {
  const caveats: Caveat[] = [];
  const layers = [layer1, layer2].filter((layer) => layer !== null);
  const thickest_m = Math.max(...layers.map(({ thickness_m }) => thickness_m));
  if (thickest_m > THICK_AGAINST_RADIUS * Math.min(radius1_m, radius2_m)) {
    caveats.push({
      code: 'layer-thick-against-particle',
      message: `A polymer layer of ${nm_from_m(thickest_m).toPrecision(2)} nm is thick against the particle; its repulsion is somewhat overstated.`,
    });
  }
  if (layers.some(({ floryChi }) => floryChi > 0.5)) {
    caveats.push({
      code: 'poor-solvency',
      message:
        'The medium is a poor solvent for the layer (χ above 0.5): the layers attract one another instead of repelling.',
    });
  } else if (layers.some(({ floryChi }) => floryChi > 0.45)) {
    caveats.push({
      code: 'marginal-solvency',
      message:
        'χ is within 0.05 of 0.5: a change of temperature or of co-solvent can turn the layer from repelling to attracting.',
    });
  }
  if ((layer1 === null) !== (layer2 === null)) {
    caveats.push({
      code: 'one-sided-layer',
      message:
        'Only one of the two particles carries a polymer layer; polymer bridging to the bare one is not counted.',
    });
  } else if (layer1 !== null && layer2 !== null && layer1.thickness_m !== layer2.thickness_m) {
    caveats.push({
      code: 'unlike-layers',
      message: 'Unlike polymer layers are taken as two equal ones of their mean thickness, amount and solvency.',
    });
  }
  return caveats;
}

/**
 * The layer of which two hold as much polymer as the unlike two: mass, dry volume and number of chains add up. (With the
 * plain mean of two densities a pair of dense layers could come out denser than dry polymer.)
 */
function mean(one: LayerInput, other: LayerInput): LayerInput {
  const sum = (of: (layer: LayerInput) => number): number => of(one) + of(other);
  const amounts_kg_m2 = sum(({ adsorbedAmount_kg_m2 }) => adsorbedAmount_kg_m2);
  return {
    thickness_m: sum(({ thickness_m }) => thickness_m) / 2,
    adsorbedAmount_kg_m2: amounts_kg_m2 / 2,
    chainMolarMass_kg_mol: amounts_kg_m2 / sum((layer) => layer.adsorbedAmount_kg_m2 / layer.chainMolarMass_kg_mol),
    polymerDensity_kg_m3: amounts_kg_m2 / sum((layer) => layer.adsorbedAmount_kg_m2 / layer.polymerDensity_kg_m3),
    floryChi: sum(({ floryChi }) => floryChi) / 2,
  };
}

/**
 * Energy of the polymer layers [J] of two particles against the gap between their bare surfaces; null without layers.
 *
 * Source  the laws named in the imports. Unlike layers as two equal ones of the mean: our convention, said as a caveat.
 * Throws  RangeError for an input that is not positive, or a layer thinner than its dry polymer.
 */
export function prepareStericLayer(pair: StericPair): StericLayer | null {
  const { radius1_m, radius2_m, layer1, layer2, solventMolecule_m3, temperature_K } = pair;
  const [present] = [layer1, layer2].filter((layer) => layer !== null);
  if (present === undefined) return null;
  mustBePositive('prepareStericLayer', { radius1_m, radius2_m, solventMolecule_m3, temperature_K });
  const thermalEnergy_J = BOLTZMANN_J_K * temperature_K;
  const meanRadius_m = (2 * radius1_m * radius2_m) / (radius1_m + radius2_m);
  const both = layer1 !== null && layer2 !== null;
  const layer = both ? mean(layer1, layer2) : present;
  const { volumeFraction, chains_per_m2, dryThickness_m } = layerProperties(layer);
  const { thickness_m, floryChi } = layer;
  // One overlap, rewritten for each gap: this runs thousands of times for every curve.
  const overlap = { separation_m: 0, meanRadius_m, thickness_m, volumeFraction };
  const energy_J = (separation_m: number): number => {
    overlap.separation_m = separation_m;
    return both
      ? thermalEnergy_J * (osmoticEnergy(overlap, floryChi, solventMolecule_m3) + elasticEnergy(overlap, chains_per_m2))
      : // A single layer stores half of what two compressed ones do.
        thermalEnergy_J *
          (oneSidedOsmoticEnergy(overlap, floryChi, solventMolecule_m3) + elasticEnergy(overlap, chains_per_m2) / 2);
  };
  return {
    energy_J,
    contact_m: both ? 2 * dryThickness_m : dryThickness_m,
    edges_m: both ? [thickness_m, 2 * thickness_m] : [thickness_m],
    caveats: caveatsOf(pair),
  };
}
