import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { grunbergNissan } from '../../../core/medium/grunbergNissan';
import { looyenga } from '../../../core/medium/looyenga';
import { lorentzLorenz } from '../../../core/medium/lorentzLorenz';

const rules = [
  {
    name: 'looyenga',
    range: { min: 1.8, max: 110 },
    mix: (parts: readonly (readonly [number, number])[]) =>
      looyenga(parts.map(([volumeFraction, relativePermittivity]) => ({ volumeFraction, relativePermittivity }))),
  },
  {
    name: 'lorentzLorenz',
    range: { min: 1.3, max: 1.7 },
    mix: (parts: readonly (readonly [number, number])[]) =>
      lorentzLorenz(parts.map(([volumeFraction, refractiveIndex]) => ({ volumeFraction, refractiveIndex }))),
  },
  {
    name: 'grunbergNissan',
    range: { min: 2e-4, max: 10 },
    mix: (parts: readonly (readonly [number, number])[]) =>
      grunbergNissan(parts.map(([moleFraction, viscosity_Pa_s]) => ({ moleFraction, viscosity_Pa_s }))),
  },
];

/** Roots and logarithms, taken and undone, cost a few units of the 16th digit. */
const ROUNDING = 1e-12;

describe.each(rules)('$name', ({ name, range, mix }) => {
  const property = fc.double({ ...range, noNaN: true });
  const share = fc.double({ min: 0.001, max: 0.999, noNaN: true });

  it('gives a pure liquid back', () => {
    fc.assert(fc.property(property, (pure) => Math.abs(mix([[1, pure]]) / pure - 1) < ROUNDING));
  });

  it('gives a liquid mixed with itself back', () => {
    const self = (pure: number, part: number) => mix([[part, pure], [1 - part, pure]]); // biome-ignore format: one line
    fc.assert(fc.property(property, share, (pure, part) => Math.abs(self(pure, part) / pure - 1) < ROUNDING));
  });

  it('lies between the two liquids', () => {
    fc.assert(
      fc.property(property, property, share, (a, b, part) => {
        const mixed = mix([
          [part, a],
          [1 - part, b],
        ]);
        return mixed >= Math.min(a, b) * (1 - ROUNDING) && mixed <= Math.max(a, b) * (1 + ROUNDING);
      }),
    );
  });

  it('rises with the share of the higher one', () => {
    const [low, high] = [range.min, range.max];
    const at = (part: number) => mix([[part, high], [1 - part, low]]); // biome-ignore format: one line
    expect(at(0.6)).toBeGreaterThan(at(0.5));
  });

  it.each([0, -1, Number.NaN])('refuses a property of %s, naming the rule', (bad) => {
    expect(() => mix([[1, bad]])).toThrow(new RegExp(name));
  });
});

it('looyenga: the cube root of an even mixture of 8 and 27 is 2.5', () => {
  const even = looyenga([
    { volumeFraction: 0.5, relativePermittivity: 8 },
    { volumeFraction: 0.5, relativePermittivity: 27 },
  ]);
  expect(even).toBeCloseTo(2.5 ** 3, 10);
});

it('grunbergNissan: an even mixture is the geometric mean', () => {
  const even_Pa_s = grunbergNissan([
    { moleFraction: 0.5, viscosity_Pa_s: 0.001 },
    { moleFraction: 0.5, viscosity_Pa_s: 0.1 },
  ]);
  expect(even_Pa_s).toBeCloseTo(0.01, 12);
});
