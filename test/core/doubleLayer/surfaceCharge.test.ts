import { describe, expect, it } from 'vitest';
import { flatSurfaceCharge, sphereSurfaceCharge } from '../../../core/doubleLayer/surfaceCharge';
import { thermalVoltage } from '../../../core/doubleLayer/thermalVoltage';
import { grahame } from '../../published/israelachvili2011DoubleLayer';
import numbers from '../../reference/doubleLayer/numbers.json';
import { plateCases } from './plateCases';

const water = { relativePermittivity: 78.5, temperature_K: 298.15 };
const sodiumChloride = (concentration_mol_m3: number) => [
  { valence: 1, concentration_mol_m3 },
  { valence: -1, concentration_mol_m3 },
];

describe('flatSurfaceCharge', () => {
  it('is 0.117 √c sinh(ψ/51.4 mV) in water at 25 °C (Israelachvili 2011, from memory, three digits)', () => {
    for (const potential_mV of [-150, -25, 10, 100]) {
      const ours_C_m2 = flatSurfaceCharge({ ions: sodiumChloride(100), potential_V: potential_mV / 1000, ...water });
      const theirs_C_m2 = grahame.coefficient_C_m2 * Math.sqrt(0.1) * Math.sinh(potential_mV / grahame.potential_mV);
      // Half of the last digit of 0.117 is 0.4 %; of 51.4 it is 0.1 %, three times over in the exponent at 150 mV.
      expect(Math.abs(ours_C_m2 / theirs_C_m2 - 1)).toBeLessThan(0.007);
    }
  });

  it('gives the charge of every surface of the solved plates whose charge was set, in five salts', () => {
    let compared = 0;
    for (const { surfaces, ions, relativePermittivity, temperature_K } of plateCases) {
      for (const { charge_C_m2, potential_V } of surfaces) {
        if (charge_C_m2 === null) continue;
        const ours_C_m2 = flatSurfaceCharge({ ions, potential_V, relativePermittivity, temperature_K });
        // The potential was found from the charge with a root finder.
        expect(Math.abs(ours_C_m2 / charge_C_m2 - 1)).toBeLessThan(1e-12);
        compared += 1;
      }
    }
    expect(compared).toBe(17);
  });

  it('is that of a condenser one Debye length wide while the potential is low', () => {
    const charge_C_m2 = flatSurfaceCharge({ ions: sodiumChloride(1), potential_V: 1e-9, ...water });
    expect(charge_C_m2 / (78.5 * 8.8541878128e-12 * (1e-9 / 9.618e-9))).toBeCloseTo(1, 3);
  });

  it('refuses potentials whose charge leaves the number range, and a medium without ions', () => {
    expect(() => flatSurfaceCharge({ ions: sodiumChloride(1), potential_V: 50, ...water })).toThrow(/charge_C_m2/);
    expect(() => flatSurfaceCharge({ ions: [], potential_V: 0.1, ...water })).toThrow(/ionicStrength_mol_m3/);
  });
});

describe('sphereSurfaceCharge', () => {
  const sphere = { ...water, radius_m: 1e-8, inverseDebyeLength_per_m: 1e9, valence: 1 };

  it('is ε(1 + κa)ψ/a while the potential is low, as for any sphere in the linear theory', () => {
    const linear_C_m2 = (78.5 * 8.8541878128e-12 * (1 + 10) * 1e-5) / 1e-8;
    expect(sphereSurfaceCharge({ ...sphere, potential_V: 1e-5 }) / linear_C_m2).toBeCloseTo(1, 6);
  });

  it('approaches the flat surface when the radius grows', () => {
    const ions = sodiumChloride(10);
    const flat_C_m2 = flatSurfaceCharge({ ions, potential_V: -0.08, ...water });
    const inverseDebyeLength_per_m = 1 / 3.0415e-9; // 10 mol/m³ of 1:1 salt
    const large_C_m2 = sphereSurfaceCharge({ ...sphere, inverseDebyeLength_per_m, radius_m: 1, potential_V: -0.08 });
    expect(large_C_m2 / flat_C_m2).toBeCloseTo(1, 3);
    expect(Math.abs(sphereSurfaceCharge({ ...sphere, potential_V: -0.08 }))).toBeGreaterThan(0);
  });

  it('is within 2.2 % of the solved sphere from κa = 1 on, up to 100 mV, and within 8.5 % at 0.3', () => {
    // The promise of the source is 5 % above κa = 0.5; these bounds are what was found, rounded up.
    const rows = numbers.sphere.filter(({ salt }) => salt === '1:1');
    expect(rows).toHaveLength(30);
    for (const { reducedPotential, kappaRadius, field } of rows) {
      const unit_V = thermalVoltage(water.temperature_K);
      const kappa = kappaRadius / sphere.radius_m; // 1/m
      const ours_C_m2 = sphereSurfaceCharge({
        ...sphere,
        inverseDebyeLength_per_m: kappa,
        potential_V: reducedPotential * unit_V,
      });
      const solved_C_m2 = 78.5 * 8.8541878128e-12 * kappa * unit_V * field;
      expect(Math.abs(ours_C_m2 / solved_C_m2 - 1)).toBeLessThan(kappaRadius < 0.5 ? 0.085 : 0.022);
    }
  });

  it('is odd in the potential and refuses a radius of zero', () => {
    expect(sphereSurfaceCharge({ ...sphere, potential_V: -0.05 })).toBe(
      -sphereSurfaceCharge({ ...sphere, potential_V: 0.05 }),
    );
    expect(() => sphereSurfaceCharge({ ...sphere, potential_V: 0.05, radius_m: 0 })).toThrow(/radius_m/);
  });
});
