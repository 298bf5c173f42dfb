import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { CONTACT_SEPARATION_m } from '../../../core/constants';
import { constantChargeEnergy } from '../../../core/doubleLayer/constantCharge';
import { constantPotentialEnergy } from '../../../core/doubleLayer/constantPotential';
import { debyeLength } from '../../../core/doubleLayer/debyeLength';
import { prepareDoubleLayer } from '../../../core/doubleLayer/doubleLayerEnergy';
import { superpositionEnergy } from '../../../core/doubleLayer/superposition';
import { doubleLayerModels } from '../../../core/scenario/scenario';

const salt = (cation: number, anion: number, concentration_mol_m3: number) => [
  { name: 'cation', valence: cation, concentration_mol_m3: anion * concentration_mol_m3 },
  { name: 'anion', valence: -anion, concentration_mol_m3: cation * concentration_mol_m3 },
];
const input = {
  ions: salt(1, 1, 10),
  relativePermittivity: 78.5,
  temperature_K: 298.15,
  radius1_m: 1e-7,
  radius2_m: 4e-8,
  zeta1_V: -0.04,
  zeta2_V: -0.03,
  slipPlane1_m: 0.5e-9,
  slipPlane2_m: 0.3e-9,
};
const laws = {
  'constant-potential': constantPotentialEnergy,
  'constant-charge': constantChargeEnergy,
  superposition: superpositionEnergy,
};

describe.each(doubleLayerModels)('prepareDoubleLayer, %s', (model) => {
  it('is its law between the slip planes: radii a + Δ, gap s − Δ₁ − Δ₂', () => {
    const energy = prepareDoubleLayer({ ...input, model });
    const kappa = 1 / debyeLength({ ...input, ionicStrength_mol_m3: 10 });
    fc.assert(
      fc.property(fc.double({ min: 1e-9, max: 5e-8, noNaN: true }), (separation_m) => {
        const law_J = laws[model]({
          gap_m: separation_m - 0.8e-9,
          radius1_m: 1.005e-7,
          radius2_m: 4.03e-8,
          potential1_V: -0.04,
          potential2_V: -0.03,
          inverseDebyeLength_per_m: kappa,
          relativePermittivity: 78.5,
          temperature_K: 298.15,
          valence: 1,
        });
        expect(energy(separation_m) / law_J).toBeCloseTo(1, 11);
      }),
    );
  });

  it('is held constant inside the slip planes, without a jump, and finite down to contact', () => {
    const energy = prepareDoubleLayer({ ...input, model });
    const edge_m = 0.8e-9 + CONTACT_SEPARATION_m;
    const held_J = energy(0);
    expect(Number.isFinite(held_J)).toBe(true);
    expect(energy(edge_m / 2)).toBe(held_J);
    expect(energy(edge_m * (1 + 1e-9)) / held_J).toBeCloseTo(1, 6);
  });

  it('does not ask which particle comes first', () => {
    const { radius1_m, zeta1_V, slipPlane1_m, radius2_m, zeta2_V, slipPlane2_m, ...medium } = input;
    const swapped = prepareDoubleLayer({
      ...medium,
      model,
      radius1_m: radius2_m,
      radius2_m: radius1_m,
      zeta1_V: zeta2_V,
      zeta2_V: zeta1_V,
      slipPlane1_m: slipPlane2_m,
      slipPlane2_m: slipPlane1_m,
    });
    expect(swapped(3e-9) / prepareDoubleLayer({ ...input, model })(3e-9)).toBeCloseTo(1, 13);
  });

  it('is finite for 500 mV, 10 000 Debye lengths, and hardly any or very much salt', () => {
    for (const ions of [salt(1, 1, 1e-9), salt(3, 1, 1000)]) {
      const energy = prepareDoubleLayer({ ...input, ions, model, zeta1_V: 0.5, zeta2_V: -0.5 });
      for (const separation_m of [0, 1e-12, 1e-9, 1e-6, 1e-4, 1])
        expect(Number.isFinite(energy(separation_m))).toBe(true);
    }
  });

  it('is zero for an uncharged pair, and says no to an input or a separation that is no number', () => {
    expect(Math.abs(prepareDoubleLayer({ ...input, model, zeta1_V: 0, zeta2_V: 0 })(3e-9))).toBe(0);
    expect(() => prepareDoubleLayer({ ...input, model, zeta1_V: Number.NaN })).toThrow(/zeta1_V/);
    expect(() => prepareDoubleLayer({ ...input, model, slipPlane2_m: -1e-9 })).toThrow(/slipPlane2_m/);
    expect(() => prepareDoubleLayer({ ...input, model })(Number.NaN)).toThrow(/separation_m/);
  });
});

describe('prepareDoubleLayer sees the actual ions', () => {
  const superposition = (ions: typeof input.ions) =>
    prepareDoubleLayer({ ...input, ions, model: 'superposition', zeta1_V: -0.05, zeta2_V: -0.05 })(6e-9);

  it('a divalent counter-ion weakens the repulsion more than its share of the ionic strength', () => {
    // The same ionic strength, 30 mol/m³: 1:1; divalent co-ions; divalent counter-ions.
    const plain_J = superposition(salt(1, 1, 30));
    expect(superposition(salt(2, 1, 10))).toBeLessThan(0.7 * plain_J);
    expect(superposition(salt(1, 2, 10))).toBeGreaterThan(plain_J);
  });

  it('moving the slip plane out at the same zeta strengthens the repulsion', () => {
    const at = (slipPlane_m: number) =>
      prepareDoubleLayer({ ...input, model: 'superposition', slipPlane1_m: slipPlane_m })(5e-9);
    expect(at(1e-9)).toBeGreaterThan(at(0));
  });
});
