import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { BOLTZMANN_J_K } from '../../../core/constants';
import { type DielectricBody, vacuum } from '../../../core/vanDerWaals/dielectricBody';
import { lifshitzNonRetarded } from '../../../core/vanDerWaals/lifshitzNonRetarded';
import { firstMatsubaraFrequency } from '../../../core/vanDerWaals/matsubaraFrequencies';
import { APERY, trilogarithm } from '../../../core/vanDerWaals/trilogarithm';
import numbers from '../../reference/vanDerWaals/numbers.json';
import { bodyFrom, type Recipe, recipeOf } from './bodies';

const temperature_K = numbers.temperature_K;
const body = (name: keyof typeof numbers.bodies) => bodyFrom(recipeOf(name));

/** Any substance from a gas-like one to rutile, with bands from the far infrared to 40 eV. */
const anyRecipe: fc.Arbitrary<Recipe> = fc
  .record({
    infrared: fc.tuple(
      fc.double({ min: 0.01, max: 100, noNaN: true }),
      fc.double({ min: 3e13, max: 8e14, noNaN: true }),
    ),
    middle: fc.tuple(fc.double({ min: 0, max: 0.5, noNaN: true }), fc.double({ min: 1e15, max: 5e15, noNaN: true })),
    ultraviolet: fc.tuple(
      fc.double({ min: 0.3, max: 6, noNaN: true }),
      fc.double({ min: 5e15, max: 6e16, noNaN: true }),
    ),
    static: fc.double({ min: 1, max: 150, noNaN: true }),
  })
  .map(({ infrared, middle, ultraviolet, static: value }) => ({
    static: value,
    oscillators: [infrared, middle, ultraviolet],
    damped: [],
  }));
const anyBody = anyRecipe.map(bodyFrom);
const conductor: DielectricBody = { ...body('rutile'), staticPermittivity: Number.POSITIVE_INFINITY };

describe('lifshitzNonRetarded against the mpmath and SciPy sum', () => {
  const systems = {
    'polystyrene-water-polystyrene': ['polystyrene', 'water', 'polystyrene'],
    'rutile-water-polystyrene': ['rutile', 'water', 'polystyrene'],
    'ptfe-cyclohexane-alumina': ['ptfe', 'cyclohexane', 'alumina'],
  } as const;
  // The reference sums 4000 terms one by one; its own tail is good to 1e-12.
  it.each(Object.keys(systems) as (keyof typeof systems)[])('%s within 1e-9', (name) => {
    const [first, medium, second] = systems[name];
    const ours = lifshitzNonRetarded({ first: body(first), medium: body(medium), second: body(second), temperature_K });
    const theirs = numbers.lifshitz[name];
    expect(Math.abs(ours.zeroFrequency_J / theirs.zeroFrequency_J - 1)).toBeLessThan(1e-13);
    expect(Math.abs(ours.dispersion_J / theirs.dispersion_J - 1)).toBeLessThan(1e-9);
  });
});

describe('lifshitzNonRetarded against every term added one by one', () => {
  it('agrees to 1e-8 of the sum of magnitudes, for any three bodies and temperature', () => {
    fc.assert(
      fc.property(
        anyBody,
        anyBody,
        anyBody,
        fc.double({ min: 250, max: 400, noNaN: true }),
        (first, second, medium, T) => {
          const xi1 = firstMatsubaraFrequency({ temperature_K: T });
          const contrast = (eps: number, eps3: number) => (eps - eps3) / (eps + eps3);
          const term = (n: number) => {
            const eps3 = medium.permittivityAt(n * xi1);
            const one = contrast(first.permittivityAt(n * xi1), eps3);
            return trilogarithm(one * contrast(second.permittivityAt(n * xi1), eps3));
          };
          // Beyond the last term f falls as n⁻⁴: the rest is n f/3, wrong by less than 1e-9 of the sum there.
          const last = 20_000;
          let sum = 0;
          let magnitude = 0;
          for (let n = last; n >= 1; n--) {
            const f = term(n);
            sum += f;
            magnitude += Math.abs(f);
          }
          sum += term(last) * (last / 3 - 0.5);
          const ours =
            lifshitzNonRetarded({ first, second, medium, temperature_K: T }).dispersion_J / (1.5 * BOLTZMANN_J_K * T);
          expect(Math.abs(ours - sum)).toBeLessThan(1e-8 * magnitude);
        },
      ),
      { numRuns: 25 },
    );
  });
});

describe('lifshitzNonRetarded obeys its law', () => {
  it('does not change when the bodies change places', () => {
    fc.assert(
      fc.property(anyBody, anyBody, anyBody, (first, second, medium) => {
        const one = lifshitzNonRetarded({ first, second, medium, temperature_K });
        const two = lifshitzNonRetarded({ first: second, second: first, medium, temperature_K });
        expect(one.hamakerConstant_J).toBe(two.hamakerConstant_J);
      }),
    );
  });

  it('always attracts between like bodies', () => {
    fc.assert(
      fc.property(anyBody, anyBody, (first, medium) => {
        const { zeroFrequency_J, dispersion_J } = lifshitzNonRetarded({ first, second: first, medium, temperature_K });
        expect(zeroFrequency_J).toBeGreaterThanOrEqual(0);
        expect(dispersion_J).toBeGreaterThan(0);
      }),
    );
  });

  it('vanishes when a body equals the medium', () => {
    fc.assert(
      fc.property(anyBody, anyBody, (first, second) => {
        const parts = lifshitzNonRetarded({ first, second, medium: { ...first }, temperature_K });
        expect(Math.abs(parts.hamakerConstant_J)).toBe(0);
      }),
    );
  });

  it('repels when the medium lies between the bodies, and splits exactly into its parts', () => {
    const parts = lifshitzNonRetarded({ first: vacuum, second: body('alumina'), medium: body('ptfe'), temperature_K });
    expect(parts.dispersion_J).toBeLessThan(0);
    expect(parts.zeroFrequency_J + parts.dispersion_J).toBe(parts.hamakerConstant_J);
  });

  it('gives two conductors 3/4 kT zeta(3) at frequency zero', () => {
    const { zeroFrequency_J } = lifshitzNonRetarded({
      first: conductor,
      second: conductor,
      medium: body('water'),
      temperature_K,
    });
    expect(zeroFrequency_J).toBeCloseTo(0.75 * BOLTZMANN_J_K * temperature_K * APERY, 34);
  });

  it.each([0, -1, Number.NaN])('refuses a temperature of %s', (bad) => {
    expect(() => lifshitzNonRetarded({ first: vacuum, second: vacuum, medium: vacuum, temperature_K: bad })).toThrow(
      /temperature_K/,
    );
  });
});

describe('firstMatsubaraFrequency', () => {
  it('is 2.45e14 rad/s at 25 °C, as every text says with three digits', () => {
    expect(Math.abs(firstMatsubaraFrequency({ temperature_K: 298.15 }) / 2.45e14 - 1)).toBeLessThan(0.003);
  });
  it('is proportional to temperature', () => {
    expect(firstMatsubaraFrequency({ temperature_K: 600 }) / firstMatsubaraFrequency({ temperature_K: 300 })).toBe(2);
  });
});
