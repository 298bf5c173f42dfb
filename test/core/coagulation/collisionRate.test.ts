import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { collisionRate } from '../../../core/coagulation/collisionRate';
import cases from '../../reference/rates/cases.json';
import { deviation } from './closedForms';

const { temperature_K, viscosity_Pa_s } = cases.collision;
const water = { temperature_K, viscosity_Pa_s };
const radii = fc.double({ min: 1e-9, max: 1e-5, noNaN: true });

describe('collisionRate, Smoluchowski 1917', () => {
  it('is 8kT/3η for equal spheres, 1.233e-17 m³/s in water at 25 °C, twice the doublet constant (1e-6)', () => {
    const ours_m3_s = collisionRate({ ...water, radius1_m: 1e-7, radius2_m: 1e-7 });
    expect(deviation(ours_m3_s, cases.collision.collisionRate_m3_s)).toBeLessThan(1e-6);
    expect(deviation(ours_m3_s / 2, cases.collision.doubletRate_m3_s)).toBeLessThan(1e-6);
  });

  it('is smallest for equal spheres, whatever their size, and the same both ways round', () => {
    const equal_m3_s = collisionRate({ ...water, radius1_m: 1e-8, radius2_m: 1e-8 });
    fc.assert(
      fc.property(radii, radii, (radius1_m, radius2_m) => {
        const one_m3_s = collisionRate({ ...water, radius1_m, radius2_m });
        expect(one_m3_s).toBeGreaterThanOrEqual(equal_m3_s * (1 - 1e-12));
        expect(collisionRate({ ...water, radius1_m: radius2_m, radius2_m: radius1_m })).toBeCloseTo(one_m3_s, 25);
      }),
    );
  });

  it.each(['radius1_m', 'radius2_m', 'temperature_K', 'viscosity_Pa_s'])('refuses a zero %s', (name) => {
    expect(() => collisionRate({ ...water, radius1_m: 1e-7, radius2_m: 1e-7, [name]: 0 })).toThrow(name);
  });
});
