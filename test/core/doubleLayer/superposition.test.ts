import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { gregorySuperpositionEnergy } from '../../../core/doubleLayer/gregorySuperposition';
import { superpositionEnergy } from '../../../core/doubleLayer/superposition';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const potential = between(-0.3, 0.3).filter((value) => Math.abs(value) > 1e-6);
const spheres = fc.record({
  gap_m: between(1e-10, 3e-8),
  radius1_m: between(1e-8, 1e-6),
  radius2_m: between(1e-8, 1e-6),
  potential1_V: potential,
  potential2_V: potential,
  inverseDebyeLength_per_m: between(1e7, 3e9),
  relativePermittivity: between(2, 90),
  temperature_K: between(270, 370),
  valence: between(1, 3),
});
const equal = {
  gap_m: 5e-9,
  radius1_m: 1e-7,
  radius2_m: 1e-7,
  potential1_V: 0.05,
  potential2_V: 0.05,
  inverseDebyeLength_per_m: 3e8,
  relativePermittivity: 78.5,
  temperature_K: 298.15,
  valence: 1,
};

describe('superpositionEnergy (Bell, Levine & McCartney 1970)', () => {
  it('becomes Gregory’s form for spheres much larger than gap and Debye length', () => {
    const large = { ...equal, radius1_m: 1e-2, radius2_m: 3e-2 };
    expect(superpositionEnergy(large) / gregorySuperpositionEnergy(large)).toBeCloseTo(1, 5);
  });

  it('is the screened Coulomb energy of two weak charges, Z²e²e^(−κh)/(4πεr(1+κa)²), for any κa', () => {
    // ψ = Ze/(4πεa(1+κa)); the energy follows as 4πε a²ψ²/r e^(−κh).
    for (const kappaRadius of [0.01, 1, 30]) {
      const weak = { ...equal, potential1_V: 1e-6, potential2_V: 1e-6, inverseDebyeLength_per_m: kappaRadius / 1e-7 };
      const permittivity_F_m = 78.5 * 8.8541878128e-12;
      const coulomb_J =
        ((4 * Math.PI * permittivity_F_m * (1e-7 * 1e-6) ** 2) / 2.05e-7) * Math.exp((-kappaRadius * 5e-9) / 1e-7);
      expect(superpositionEnergy(weak) / coulomb_J).toBeCloseTo(1, 8);
    }
  });

  it('does not ask which sphere comes first; its sign is that of the product of the charges', () => {
    fc.assert(
      fc.property(spheres, (s) => {
        const value_J = superpositionEnergy(s);
        const swapped_J = superpositionEnergy({
          ...s,
          radius1_m: s.radius2_m,
          radius2_m: s.radius1_m,
          potential1_V: s.potential2_V,
          potential2_V: s.potential1_V,
        });
        expect(Math.abs(swapped_J - value_J)).toBeLessThanOrEqual(1e-13 * Math.abs(value_J));
        expect(Math.sign(value_J)).toBe(Math.sign(s.potential1_V * s.potential2_V));
      }),
    );
  });

  it('decays as e^(−κh) over the distance of the centres', () => {
    const at = (gap_m: number) => superpositionEnergy({ ...equal, gap_m });
    expect(at(7e-9) / at(5e-9)).toBeCloseTo((Math.exp(-3e8 * 2e-9) * 2.05e-7) / 2.07e-7, 13);
  });

  it('falls with more salt at a fixed potential, from one Debye length on', () => {
    fc.assert(
      fc.property(spheres, between(1.05, 3), between(1, 10), (drawn, factor, kappaGap) => {
        const s = {
          ...drawn,
          potential2_V: drawn.potential1_V,
          gap_m: kappaGap / drawn.inverseDebyeLength_per_m,
        };
        const saltier = { ...s, inverseDebyeLength_per_m: factor * s.inverseDebyeLength_per_m };
        expect(superpositionEnergy(saltier)).toBeLessThan(superpositionEnergy(s));
        expect(gregorySuperpositionEnergy(saltier)).toBeLessThan(gregorySuperpositionEnergy(s));
      }),
    );
  });

  it('hardly grows beyond 200 mV: counter-ions take up the rest', () => {
    const high = superpositionEnergy({ ...equal, potential1_V: 0.5, potential2_V: 0.5 });
    expect(high / superpositionEnergy({ ...equal, potential1_V: 0.25, potential2_V: 0.25 })).toBeLessThan(1.05);
  });

  it('is finite at 500 mV, at 1e-12 m, and at 10 000 Debye lengths', () => {
    for (const gap_m of [1e-300, 1e-12, 3.4e-5, 10]) {
      const strong = { ...equal, potential1_V: 0.5, potential2_V: -0.5, gap_m };
      for (const energy of [superpositionEnergy, gregorySuperpositionEnergy]) {
        expect(Number.isFinite(energy(strong))).toBe(true);
      }
    }
  });

  it('refuses contact and a valence of zero', () => {
    for (const energy of [superpositionEnergy, gregorySuperpositionEnergy]) {
      expect(() => energy({ ...equal, gap_m: 0 })).toThrow(/gap_m/);
      expect(() => energy({ ...equal, valence: 0 })).toThrow(/valence/);
    }
  });
});
