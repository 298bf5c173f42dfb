import { AVOGADRO_per_mol, BOLTZMANN_J_K } from '../constants';
import { bjerrumLength } from '../doubleLayer/bjerrumLength';
import { debyeLength } from '../doubleLayer/debyeLength';
import type { MediumState } from '../evaluation';
import { findMaterial } from '../materials/catalogue';
import type { Material } from '../materials/material';
import { mediumState } from '../medium/mediumState';
import { viscosityIsKnown } from '../medium/mediumViscosity';
import { done, type Problem, type Result, refused } from '../problem';
import { K_from_degC, kg_m2_from_mg_m2, kg_mol_from_g_mol, m_from_nm, V_from_mV } from '../quantities/convert';
import type { Formulation, Particle } from '../scenario/scenario';
import type { LayerInput } from '../stericLayer/layerProperties';
import type { Caveat } from '../validity';
import { sharesOf } from './loading';

/** A formulation in SI, its medium worked out: what every law needs, and nothing of the user's units. */
export interface FormulationModel {
  readonly name: string;
  readonly temperature_K: number;
  readonly thermalEnergy_J: number;
  readonly medium: MediumState;
  readonly components: readonly { readonly material: Material; readonly volumeFraction: number }[];
  /** Mean volume of one molecule of the medium, the lattice site of the polymer layer's osmotic term. */
  readonly solventMolecule_m3: number;
  readonly particles: readonly ParticleModel[];
  readonly caveats: readonly Caveat[];
}

export interface ParticleModel {
  readonly name: string;
  readonly material: Material;
  readonly radius_m: number;
  readonly density_kg_m3: number;
  readonly volumeFraction: number;
  readonly massFraction: number;
  readonly numberDensity_per_m3: number;
  readonly charge: { readonly zeta_V: number; readonly slipPlane_m: number } | null;
  readonly layer: LayerInput | null;
}

/** Highest share of solids the pair picture can carry: random close packing. */
const CLOSE_PACKING = 0.64;

const materialOf = (id: string): Material => {
  const material = findMaterial(id);
  if (material === undefined) throw new RangeError(`formulationModel: material "${id}" is not in the catalogue`);
  return material;
};

/** Mean over the mole fractions. Components of unknown molar mass (resins) are left out: they do not solvate as one. */
function meanMoleculeVolume(components: FormulationModel['components']): number {
  let moles = 0;
  let volume_m3 = 0;
  for (const { material, volumeFraction } of components) {
    if (material.kind !== 'solvent' || material.molarMass_kg_mol === null) continue;
    moles += (volumeFraction * material.density_kg_m3.value) / material.molarMass_kg_mol.value;
    volume_m3 += volumeFraction;
  }
  const waterMolecule_m3 = 2.99e-29; // molar volume of water over Avogadro's number
  return moles > 0 ? volume_m3 / moles / AVOGADRO_per_mol : waterMolecule_m3;
}

function screened(state: Omit<MediumState, 'debyeLength_m' | 'bjerrumLength_m'>): MediumState {
  const { ionicStrength_mol_m3, relativePermittivity, temperature_K } = state;
  return {
    ...state,
    debyeLength_m:
      ionicStrength_mol_m3 > 0 ? debyeLength({ ionicStrength_mol_m3, relativePermittivity, temperature_K }) : null,
    bjerrumLength_m: bjerrumLength({ relativePermittivity, temperature_K }),
  };
}

function layerInput(particle: Particle): LayerInput | null {
  const { layer } = particle;
  if (layer === null) return null;
  return {
    thickness_m: m_from_nm(layer.thickness_nm),
    adsorbedAmount_kg_m2: kg_m2_from_mg_m2(layer.adsorbedAmount_mg_m2),
    chainMolarMass_kg_mol: kg_mol_from_g_mol(layer.chainMolarMass_g_mol),
    polymerDensity_kg_m3: layer.polymerDensity_kg_m3,
    floryChi: layer.floryChi,
  };
}

function problemsOf(formulation: Formulation, medium: MediumState, solids: number | null): Problem[] {
  const problems: Problem[] = [];
  if (solids === null || solids > CLOSE_PACKING) {
    problems.push({
      code: 'too-much-solid',
      at: '/particles/0/loading_percent',
      message:
        solids === null
          ? 'The particles take up the whole formulation: no room is left for the medium.'
          : `The particles fill ${(100 * solids).toFixed(0)} % of the volume; spheres pack at ${100 * CLOSE_PACKING} %.`,
      remedy: 'Lower the loading, or check whether it is per cent by mass or by volume.',
    });
  }
  formulation.particles.forEach((particle, index) => {
    if (particle.charge !== null && medium.debyeLength_m === null) {
      problems.push({
        code: 'charge-without-ions',
        at: `/particles/${index}/charge`,
        message:
          'A charged particle needs ions around it, but the medium holds none: the range of the repulsion is then unknown.',
        remedy: 'Enter the salts or the pH (or the conductivity as an ionic strength), or switch the charge off.',
      });
    }
    if (particle.layer !== null) {
      const { adsorbedAmount_mg_m2, polymerDensity_kg_m3, thickness_nm } = particle.layer;
      const dryThickness_nm = (1000 * adsorbedAmount_mg_m2) / polymerDensity_kg_m3;
      if (dryThickness_nm > thickness_nm) {
        problems.push({
          code: 'layer-too-thin',
          at: `/particles/${index}/layer/thickness_nm`,
          message: `${adsorbedAmount_mg_m2} mg/m² of polymer is ${dryThickness_nm.toPrecision(3)} nm thick when dry, more than the ${thickness_nm} nm entered.`,
          remedy: 'Enter a greater thickness or a smaller adsorbed amount.',
        });
      }
    }
  });
  return problems;
}

/** Converts once, at the door. Problems carry pointers within the formulation; the caller puts its own in front. */
export function formulationModel(formulation: Formulation): Result<FormulationModel> {
  if (!formulation.medium.components.some(({ volumeParts }) => volumeParts > 0)) {
    return refused({
      code: 'empty-medium',
      at: '/medium/components/0',
      message: 'The medium holds no liquid: every volume part is zero.',
      remedy: 'Give at least one component a volume part above zero.',
    });
  }
  if (!viscosityIsKnown(formulation.medium)) {
    return refused({
      code: 'viscosity-unknown',
      at: '/medium/measuredViscosity_mPa_s',
      message: 'No component of the medium has a viscosity in the catalogue.',
      remedy: 'Enter the measured viscosity of the medium.',
    });
  }
  const temperature_K = K_from_degC(formulation.temperature_degC);
  const { state, volumeFractions, caveats } = mediumState({
    recipe: formulation.medium,
    temperature_degC: formulation.temperature_degC,
    salts: formulation.salts,
    hardness_dH: formulation.hardness_dH,
    pH: formulation.pH,
  });
  const medium = screened(state);
  const components = formulation.medium.components.map((component, index) => ({
    material: materialOf(component.material),
    volumeFraction: volumeFractions[index] ?? 0,
  }));
  const densities_kg_m3 = formulation.particles.map(
    (particle) => particle.density_kg_m3 ?? materialOf(particle.material).density_kg_m3.value,
  );
  const shares = sharesOf(
    formulation.particles.map((particle, index) => ({
      basis: particle.loadingBasis,
      fraction: particle.loading_percent / 100,
      density_kg_m3: densities_kg_m3[index],
    })),
    medium.density_kg_m3,
  );
  const solids = shares === null ? null : shares.reduce((sum, share) => sum + share.volumeFraction, 0);
  const problems = problemsOf(formulation, medium, solids);
  if (shares === null || problems.length > 0) return refused(...problems);
  return done({
    name: formulation.name,
    temperature_K,
    thermalEnergy_J: BOLTZMANN_J_K * temperature_K,
    medium,
    components,
    solventMolecule_m3: meanMoleculeVolume(components),
    particles: formulation.particles.map((particle, index) => {
      const radius_m = m_from_nm(particle.diameter_nm) / 2;
      const { volumeFraction, massFraction } = shares[index];
      return {
        name: particle.name,
        material: materialOf(particle.material),
        radius_m,
        density_kg_m3: densities_kg_m3[index],
        volumeFraction,
        massFraction,
        numberDensity_per_m3: volumeFraction / ((4 / 3) * Math.PI * radius_m ** 3),
        charge:
          particle.charge === null
            ? null
            : { zeta_V: V_from_mV(particle.charge.zeta_mV), slipPlane_m: m_from_nm(particle.charge.slipPlane_nm) },
        layer: layerInput(particle),
      };
    }),
    caveats,
  });
}
