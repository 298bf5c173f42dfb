import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { blendBodies } from '../../../core/vanDerWaals/blendBodies';
import { bodyOf, vacuum } from '../../../core/vanDerWaals/dielectricBody';
import { materialFrom, recipeOf } from './bodies';

const water = bodyOf(materialFrom('water', recipeOf('water')), 78);
const oil = bodyOf(materialFrom('cyclohexane', recipeOf('cyclohexane')), 2);

describe('blendBodies', () => {
  it('is the liquid itself when there is only one, but for the static value', () => {
    const alone = blendBodies(
      [
        { body: water, volumeFraction: 1 },
        { body: oil, volumeFraction: 0 },
      ],
      70,
    );
    expect(alone.permittivityAt(3e15)).toBe(water.permittivityAt(3e15));
    expect(alone.opticalLimit).toEqual(water.opticalLimit);
    expect(alone.staticPermittivity).toBe(70);
  });

  it('gives the liquid itself when it is mixed with itself', () => {
    fc.assert(
      fc.property(fc.double({ min: 0.01, max: 0.99, noNaN: true }), (part) => {
        const self = blendBodies(
          [
            { body: oil, volumeFraction: part },
            { body: oil, volumeFraction: 1 - part },
          ],
          2,
        );
        for (const xi of [2.5e14, 3e15, 2e16, 1e18]) {
          expect(self.permittivityAt(xi)).toBeCloseTo(oil.permittivityAt(xi), 12);
        }
        expect(self.opticalLimit?.frequency_rad_s).toBeCloseTo(oil.opticalLimit?.frequency_rad_s ?? 0, -4);
      }),
    );
  });

  it('lies between its parts at every frequency, and moves with the recipe', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0.01, max: 0.98, noNaN: true }),
        fc.double({ min: 14.4, max: 17.5, noNaN: true }),
        (part, exponent) => {
          const xi = 10 ** exponent;
          const mix = (share: number) =>
            blendBodies(
              [
                { body: water, volumeFraction: share },
                { body: oil, volumeFraction: 1 - share },
              ],
              40,
            );
          const [low, high] = [water.permittivityAt(xi), oil.permittivityAt(xi)].sort((a, b) => a - b);
          expect(mix(part).permittivityAt(xi)).toBeGreaterThanOrEqual(low);
          expect(mix(part).permittivityAt(xi)).toBeLessThanOrEqual(high);
        },
      ),
    );
  });

  it('adds refractions: diluted with vacuum, (eps - 1)/(eps + 2) is halved', () => {
    const half = blendBodies(
      [
        { body: oil, volumeFraction: 0.5 },
        { body: vacuum, volumeFraction: 0.5 },
      ],
      1.5,
    );
    const refraction = (eps: number) => (eps - 1) / (eps + 2);
    expect(refraction(half.permittivityAt(3e15))).toBeCloseTo(refraction(oil.permittivityAt(3e15)) / 2, 14);
    expect(half.opticalLimit).toBeNull();
  });

  it('has an optical limit that reproduces the blend from the visible to the far ultraviolet', () => {
    // One band against two: the largest difference between these bands is 3 % in frequency.
    const mix = blendBodies(
      [
        { body: water, volumeFraction: 0.5 },
        { body: oil, volumeFraction: 0.5 },
      ],
      40,
    );
    const n = mix.opticalLimit?.refractiveIndex ?? 0;
    const omega = mix.opticalLimit?.frequency_rad_s ?? 0;
    for (const xi of [5e15, 1e16, 2e16, 5e16]) {
      expect((n * n - 1) / (1 + (xi / omega) ** 2) / (mix.permittivityAt(xi) - 1)).toBeCloseTo(1, 2);
    }
  });

  it('refuses fractions that do not add up to one', () => {
    expect(() => blendBodies([{ body: oil, volumeFraction: 0.9 }], 2)).toThrow(/add up/);
    expect(() =>
      blendBodies(
        [
          { body: oil, volumeFraction: 1.5 },
          { body: water, volumeFraction: -0.5 },
        ],
        2,
      ),
    ).toThrow(/volumeFraction/);
  });
});
