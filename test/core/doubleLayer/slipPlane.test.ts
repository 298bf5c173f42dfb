import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { surfacePotentialFromZeta, zetaFromSurfacePotential } from '../../../core/doubleLayer/slipPlane';
import { thermalVoltage } from '../../../core/doubleLayer/thermalVoltage';

const water = { temperature_K: 298.15, inverseDebyeLength_per_m: 1 / 3e-9, valence: 1 };
const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });

describe('slip plane', () => {
  it('keeps Eversole and Boardman’s relation, written as it stands', () => {
    fc.assert(
      fc.property(between(-0.2, 0.2), between(0, 1e-8), between(1, 3), (surfacePotential_V, slipPlane_m, valence) => {
        const zeta_V = zetaFromSurfacePotential({ ...water, valence, surfacePotential_V, slipPlane_m });
        const t = (potential_V: number) => Math.tanh((valence * potential_V) / (4 * thermalVoltage(298.15)));
        const fall = Math.exp(-slipPlane_m * water.inverseDebyeLength_per_m);
        expect(t(zeta_V)).toBeCloseTo(t(surfacePotential_V) * fall, 14);
      }),
    );
  });

  it('gives zeta back after there and back', () => {
    fc.assert(
      fc.property(between(-0.3, 0.3), between(0, 5e-9), between(1, 3), (zeta_V, slipPlane_m, valence) => {
        const plane = { ...water, valence, slipPlane_m };
        const surfacePotential_V = surfacePotentialFromZeta({ ...plane, zeta_V });
        if (surfacePotential_V === null) {
          // None exists: even an enormous charge leaves less than this zeta.
          expect(Math.abs(zetaFromSurfacePotential({ ...plane, surfacePotential_V: 10 }))).toBeLessThanOrEqual(
            Math.abs(zeta_V) * (1 + 1e-12),
          );
          return;
        }
        expect(Math.abs(surfacePotential_V)).toBeGreaterThanOrEqual(Math.abs(zeta_V) * (1 - 1e-12));
        // Near the bound a change of the surface potential hardly shows at the slip plane; the way back is still good.
        const again_V = zetaFromSurfacePotential({ ...plane, surfacePotential_V });
        expect(Math.abs(again_V - zeta_V)).toBeLessThanOrEqual(1e-12 * Math.abs(zeta_V));
      }),
    );
  });

  it('says null for a zeta beyond what any charge leaves at this distance', () => {
    const slipPlane_m = 3e-9; // one Debye length: tanh(eζ/4kT) is at most 1/e, so ζ at most 39.7 mV
    const highest_V = 4 * thermalVoltage(298.15) * Math.atanh(Math.exp(-1));
    expect(surfacePotentialFromZeta({ ...water, slipPlane_m, zeta_V: highest_V * 1.001 })).toBeNull();
    expect(surfacePotentialFromZeta({ ...water, slipPlane_m, zeta_V: -highest_V * 1.001 })).toBeNull();
    expect(surfacePotentialFromZeta({ ...water, slipPlane_m, zeta_V: highest_V * 0.999 })).toBeGreaterThan(0.15);
  });

  it('is the potential itself without a distance, and zero for zero', () => {
    expect(surfacePotentialFromZeta({ ...water, slipPlane_m: 0, zeta_V: 3 })).toBe(3);
    expect(surfacePotentialFromZeta({ ...water, slipPlane_m: 1e-3, zeta_V: 0 })).toBe(0);
    expect(zetaFromSurfacePotential({ ...water, slipPlane_m: 1e-3, surfacePotential_V: 0.5 })).toBe(0);
  });

  it('falls as e^(−κΔ) while the potential is low', () => {
    const zeta_V = zetaFromSurfacePotential({ ...water, slipPlane_m: 3e-9, surfacePotential_V: 1e-5 });
    expect(zeta_V / 1e-5).toBeCloseTo(Math.exp(-1), 7);
  });

  it('refuses a negative distance and a potential that is no number', () => {
    expect(() => surfacePotentialFromZeta({ ...water, slipPlane_m: -1e-9, zeta_V: 0.01 })).toThrow(/slipPlane_m/);
    expect(() => zetaFromSurfacePotential({ ...water, slipPlane_m: 0, surfacePotential_V: Number.NaN })).toThrow(
      /surfacePotential_V/,
    );
  });
});
