import { barePotential } from '../doubleLayer/barePotential';
import type { MediumState, ParticleState, SettlingState } from '../evaluation';
import { settlingState } from '../settling/settlingState';
import type { FormulationModel, ParticleModel } from './formulationModel';
import type { RequirementModel } from './requirementModel';

function surfacePotential(particle: ParticleModel, medium: MediumState): number | null {
  if (particle.charge === null || medium.debyeLength_m === null) return null;
  return barePotential({
    ions: medium.ions,
    zeta_V: particle.charge.zeta_V,
    slipPlane_m: particle.charge.slipPlane_m,
    inverseDebyeLength_per_m: 1 / medium.debyeLength_m,
    temperature_K: medium.temperature_K,
  });
}

/** How one kind of particle settles in the medium at rest, among all the others. */
export function particleSettling(
  { radius_m, density_kg_m3 }: ParticleModel,
  { medium, temperature_K, particles }: FormulationModel,
  requirement: RequirementModel,
): SettlingState {
  return settlingState({
    radius_m,
    densityDifference_kg_m3: density_kg_m3 - medium.density_kg_m3,
    viscosity_Pa_s: medium.viscosity_Pa_s,
    temperature_K,
    volumeFraction: particles.reduce((sum, one) => sum + one.volumeFraction, 0),
    fillHeight_m: requirement.fillHeight_m,
    acceptedClearLayer: requirement.acceptedClearLayer,
  });
}

/** What is shown of one kind of particle: the recipe converted, its potentials, its fall. */
export function particleState(
  particle: ParticleModel,
  model: FormulationModel,
  requirement: RequirementModel,
): ParticleState {
  const { medium } = model;
  const { charge, layer, name, radius_m, density_kg_m3, volumeFraction, massFraction, numberDensity_per_m3 } = particle;
  return {
    name,
    radius_m,
    density_kg_m3,
    volumeFraction,
    massFraction,
    numberDensity_per_m3,
    kappaRadius: medium.debyeLength_m === null ? null : radius_m / medium.debyeLength_m,
    zeta_V: charge?.zeta_V ?? null,
    surfacePotential_V: surfacePotential(particle, medium),
    layerThickness_m: layer?.thickness_m ?? 0,
    layerVolumeFraction:
      layer === null ? null : layer.adsorbedAmount_kg_m2 / (layer.polymerDensity_kg_m3 * layer.thickness_m),
    settling: particleSettling(particle, model, requirement),
  };
}
