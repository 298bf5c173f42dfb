import { BOLTZMANN_J_K } from '../../../core/constants';
import plates from '../../reference/doubleLayer/plates.json';

/** The solved plates under our names. */
export const plateCases = plates.cases.map((one) => {
  const { expected } = one;
  const potentials_V = [expected.isolatedDiffusePotential1V, expected.isolatedDiffusePotential2V];
  return {
    id: one.id,
    salt: one.salt,
    ions: one.ions.map((ion) => ({ valence: ion.valence, concentration_mol_m3: ion.concentrationMolPerM3 })),
    relativePermittivity: one.relativePermittivity,
    temperature_K: one.temperatureK,
    gap_m: one.gapM,
    radius1_m: one.radius1M,
    radius2_m: one.radius2M,
    inverseDebyeLength_per_m: 1 / expected.debyeLengthM,
    kappaGap: one.gapM / expected.debyeLengthM,
    surfaces: [one.surface1, one.surface2].map((surface, i) => ({
      held: surface.bc,
      charge_C_m2: 'sigma' in surface && typeof surface.sigma === 'number' ? surface.sigma : null,
      potential_V: potentials_V[i],
    })),
    /** Spheres by Derjaguin's approximation. */
    energy_J: expected.sphereEnergyDerjaguinKT * BOLTZMANN_J_K * one.temperatureK,
  };
});
