import { describe, expect, it } from 'vitest';
import { bodyOf, staticPermittivityOfSolid, vacuum } from '../../../core/vanDerWaals/dielectricBody';
import { responseOf } from '../../../core/vanDerWaals/dielectricResponse';
import { materialFrom, type Recipe, recipeOf, responseFrom } from './bodies';

const rutile = recipeOf('rutile');
const twoBands: Recipe = {
  static: 4,
  oscillators: [
    [1, 2e15],
    [1, 2e16],
  ],
  damped: [],
};

describe('responseOf', () => {
  it('has half the strength of a single oscillator left at its own frequency', () => {
    const response = responseOf(responseFrom({ static: 2, oscillators: [[1, 1e16]], damped: [] }));
    expect(response(1e16)).toBeCloseTo(1.5, 14);
    expect(response(1)).toBeCloseTo(2, 14);
    expect(response(1e22)).toBeCloseTo(1, 10);
  });

  it('adds a damped oscillator, f/(w² + g xi + xi²)', () => {
    const response = responseOf(responseFrom({ static: 2, oscillators: [], damped: [[6e32, 1e16, 1e16]] }));
    expect(response(1e16)).toBeCloseTo(1 + 6 / 3, 14);
  });

  it('falls steadily with frequency', () => {
    const response = responseOf(responseFrom(recipeOf('water')));
    let last = Number.POSITIVE_INFINITY;
    for (let exponent = 14; exponent < 19; exponent += 0.1) {
      const next = response(10 ** exponent);
      expect(next).toBeLessThan(last);
      last = next;
    }
  });

  it('leaves microwave terms to the static permittivity', () => {
    const plain = responseFrom({ static: 2, oscillators: [[1, 1e16]], damped: [] });
    const debye = { strength: 75, frequency_rad_s: 1e11, band: 'microwave' } as const;
    const both = responseOf({ ...plain, oscillators: [...plain.oscillators, debye] });
    expect(both(1e10)).toBe(responseOf(plain)(1e10));
  });
});

describe('bodyOf', () => {
  it('takes the matched pair of the one ultraviolet band, not the infrared', () => {
    const { opticalLimit } = bodyOf(materialFrom('rutile', rutile), 114);
    expect(opticalLimit?.refractiveIndex).toBeCloseTo(Math.sqrt(1 + 5.2932), 12);
    expect(opticalLimit?.frequency_rad_s).toBe(7.7387e15);
  });

  it('has no optical limit with two bands, a damped band, or a full spectrum', () => {
    expect(bodyOf(materialFrom('two', twoBands), 4).opticalLimit).toBeNull();
    const damped = materialFrom('damped', { static: 4, oscillators: [[1, 2e16]], damped: [[1e32, 1e16, 1e15]] });
    expect(bodyOf(damped, 4).opticalLimit).toBeNull();
    const full = materialFrom('full', rutile, { dielectricResponses: [responseFrom(rutile, 'full-spectrum')] });
    expect(bodyOf(full, 4).opticalLimit).toBeNull();
  });

  it('takes the response of the wanted level, or else the recommended one', () => {
    const both = materialFrom('both', rutile, {
      dielectricResponses: [responseFrom(rutile), responseFrom(twoBands, 'full-spectrum')],
    });
    expect(bodyOf(both, 9, 'full-spectrum').permittivityAt(1e3)).toBeCloseTo(3, 10);
    expect(bodyOf(both, 9).permittivityAt(1e3)).toBeCloseTo(1 + 109.67 + 5.2932, 8);
    expect(bodyOf(materialFrom('one', rutile), 9, 'full-spectrum').permittivityAt(1e3)).toBeCloseTo(115.9632, 6);
  });

  it.each([0.5, 0, Number.NaN])('refuses a static permittivity of %s', (bad) => {
    expect(() => bodyOf(materialFrom('rutile', rutile), bad)).toThrow(/staticPermittivity/);
  });
});

describe('staticPermittivityOfSolid', () => {
  it('is unbounded for a conductor and null when unknown', () => {
    expect(staticPermittivityOfSolid(materialFrom('r', rutile))).toBe(114);
    expect(staticPermittivityOfSolid(materialFrom('r', rutile, { conductor: true }))).toBe(Number.POSITIVE_INFINITY);
    expect(staticPermittivityOfSolid(materialFrom('r', rutile, { staticPermittivity: null }))).toBeNull();
  });
});

describe('vacuum', () => {
  it('does not respond', () => {
    expect(vacuum.permittivityAt(1e15)).toBe(1);
    expect(vacuum.staticPermittivity).toBe(1);
  });
});
