import { AVOGADRO_per_mol } from '../constants';
import { mustBeFinite, mustBePositive } from '../validity';

/** An adsorbed or grafted polymer layer in SI. */
export interface LayerInput {
  readonly thickness_m: number;
  readonly adsorbedAmount_kg_m2: number;
  /** Of one stabilising chain. */
  readonly chainMolarMass_kg_mol: number;
  readonly polymerDensity_kg_m3: number;
  readonly floryChi: number;
}

export interface LayerProperties {
  /** Γ/ρ: the layer squeezed dry. */
  readonly dryThickness_m: number;
  /** Mean share of polymer in the layer by volume. */
  readonly volumeFraction: number;
  readonly chains_per_m2: number;
  /** Mean distance between anchors, σ^(−1/2). */
  readonly chainSpacing_m: number;
}

/**
 * What follows from amount and thickness: φ = Γ/(ρδ), σ = Γ N_A/M, s = σ^(−1/2).
 *
 * Source  mass balance.
 * Valid   uniform layer; the caller refuses layers thinner than their dry polymer.
 * Throws  RangeError for an input that is not positive, or a layer thinner than its dry polymer.
 */
export function layerProperties(layer: LayerInput): LayerProperties {
  const { thickness_m, adsorbedAmount_kg_m2, chainMolarMass_kg_mol, polymerDensity_kg_m3, floryChi } = layer;
  mustBePositive('layerProperties', { thickness_m, adsorbedAmount_kg_m2, chainMolarMass_kg_mol, polymerDensity_kg_m3 });
  mustBeFinite('layerProperties', { floryChi });
  const dryThickness_m = adsorbedAmount_kg_m2 / polymerDensity_kg_m3;
  const volumeFraction = dryThickness_m / thickness_m;
  if (volumeFraction > 1 + 1e-12) {
    throw new RangeError(`layerProperties: thickness_m ${thickness_m} is below the dry thickness ${dryThickness_m}`);
  }
  const chains_per_m2 = (adsorbedAmount_kg_m2 * AVOGADRO_per_mol) / chainMolarMass_kg_mol;
  return { dryThickness_m, volumeFraction, chains_per_m2, chainSpacing_m: chains_per_m2 ** -0.5 };
}
