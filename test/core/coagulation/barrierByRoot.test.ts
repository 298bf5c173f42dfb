import { describe, expect, it } from 'vitest';
import { requiredBarrier } from '../../../core/coagulation/requiredBarrier';
import { lnStabilityRatio } from '../../../core/coagulation/stabilityRatio';
import { CONTACT_SEPARATION_m } from '../../../core/constants';
import { brentRoot } from '../../../core/numerics/brentRoot';
import { findFeatures } from '../../../core/pairEnergy/curveFeatures';
import { separationGrid } from '../../../core/pairEnergy/separationGrid';
import { alike, type ChargedPair, energyOf, inverseDebyeLength } from './closedForms';

const lnOf = (pair: ChargedPair): number =>
  lnStabilityRatio({ ...pair, energy_kT: energyOf(pair), contact_m: CONTACT_SEPARATION_m });

function barrierOf(pair: ChargedPair): number {
  const gaps_m = separationGrid({
    contact_m: CONTACT_SEPARATION_m,
    edges_m: [],
    ranges_m: [1 / inverseDebyeLength(pair), 100e-9],
  });
  return findFeatures(energyOf(pair), gaps_m).barrier?.energy_kT ?? 0;
}

const systems = [
  { radius_m: 150e-9, hamakerConstant_J: 5.35e-20, ionicStrength_mol_m3: 10 },
  { radius_m: 150e-9, hamakerConstant_J: 5.35e-20, ionicStrength_mol_m3: 3 },
  { radius_m: 100e-9, hamakerConstant_J: 2e-20, ionicStrength_mol_m3: 10 },
  { radius_m: 60e-9, hamakerConstant_J: 3e-20, ionicStrength_mol_m3: 5 },
  { radius_m: 50e-9, hamakerConstant_J: 1e-20, ionicStrength_mol_m3: 30 },
  { radius_m: 50e-9, hamakerConstant_J: 5e-20, ionicStrength_mol_m3: 30 },
];
const questions = systems.flatMap((system) => [15, 20, 28].map((wanted) => ({ ...system, wanted })));

describe('requiredBarrier against the curve that just gives the ln W asked for', () => {
  it.each(questions)(
    'a = $radius_m m, A = $hamakerConstant_J J, I = $ionicStrength_mol_m3 mM, ln W = $wanted: 1.5 kT',
    ({ wanted, ...system }) => {
      const at = (potential_V: number) =>
        alike({ ...system, potential_V, relativePermittivity: 78.3, temperature_K: 298.15 });
      const potential_V = brentRoot((one_V) => lnOf(at(one_V)) - wanted, 5e-3, 0.2, 1e-9);
      const ours_kT = requiredBarrier({
        lnRequiredStabilityRatio: wanted,
        meanRadius_m: system.radius_m,
        repulsionRange_m: 1 / inverseDebyeLength(at(potential_V)),
      });
      expect(Math.abs(ours_kT - barrierOf(at(potential_V)))).toBeLessThan(1.5);
    },
  );
});
