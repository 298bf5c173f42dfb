import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { barePotential } from '../../../core/doubleLayer/barePotential';
import { surfacePotentialFromZeta } from '../../../core/doubleLayer/slipPlane';

const temperature_K = 298.15;
const oneToOne = [
  { valence: 1, concentration_mol_m3: 10 },
  { valence: -1, concentration_mol_m3: 10 },
];
const twoToOne = [
  { valence: 2, concentration_mol_m3: 5 },
  { valence: -1, concentration_mol_m3: 10 },
];
const inverseDebyeLength_per_m = 1 / 3e-9;
const plane = { slipPlane_m: 1e-9, inverseDebyeLength_per_m, temperature_K };

describe('barePotential', () => {
  it('is Eversole and Boardman’s closed form in a 1:1 salt', () => {
    fc.assert(
      fc.property(fc.double({ min: -0.12, max: 0.12, noNaN: true }), (zeta_V) => {
        const ours_V = barePotential({ ...plane, ions: oneToOne, zeta_V });
        const theirs_V = surfacePotentialFromZeta({ ...plane, zeta_V, valence: 1 });
        if (theirs_V === null) expect(ours_V).toBeNull();
        else expect(ours_V ?? Number.NaN).toBeCloseTo(theirs_V, 9);
      }),
    );
  });

  it('differs by the sign of the surface where one kind of ion carries two charges', () => {
    const negative_V = barePotential({ ...plane, ions: twoToOne, zeta_V: -0.03 }) ?? 0;
    const positive_V = barePotential({ ...plane, ions: twoToOne, zeta_V: 0.03 }) ?? 0;
    // Divalent counter-ions gather at the negative surface, so the potential falls faster there.
    expect(Math.abs(negative_V)).toBeGreaterThan(positive_V);
  });

  it('says so when no surface could still have that zeta at the slip plane', () => {
    expect(barePotential({ ...plane, ions: oneToOne, zeta_V: 0.09, slipPlane_m: 5e-9 })).toBeNull();
  });

  it('is zeta itself where the planes coincide', () => {
    expect(barePotential({ ...plane, ions: twoToOne, zeta_V: -0.04, slipPlane_m: 0 })).toBe(-0.04);
  });
});
