import { describe, expect, it } from 'vitest';
import { chooseDoubleLayerModel, insideValidity } from '../../../core/doubleLayer/doubleLayerChoice';
import { doubleLayerModels } from '../../../core/scenario/scenario';

const pair = {
  choice: 'by-validity',
  potential1_V: -0.02,
  potential2_V: 0.024,
  kappaRadiusSmaller: 30,
  temperature_K: 298.15,
  ions: [
    { valence: 1, concentration_mol_m3: 10 },
    { valence: -1, concentration_mol_m3: 10 },
  ],
} as const;
const codes = (caveats: readonly { readonly code: string }[]) => caveats.map(({ code }) => code);

describe('chooseDoubleLayerModel by validity', () => {
  it('takes constant potential for low potentials on large particles, and says so with numbers', () => {
    const { model, reason, caveats } = chooseDoubleLayerModel(pair);
    expect(model).toBe('constant-potential');
    expect(reason).toMatch(/25\.7 mV.*30 Debye lengths/);
    expect(caveats).toEqual([]);
  });

  it('takes superposition as soon as one of the potentials leaves the linear range', () => {
    const { model, reason, caveats } = chooseDoubleLayerModel({ ...pair, potential1_V: -0.045 });
    expect(model).toBe('superposition');
    expect(reason).toMatch(/45 mV/);
    expect(caveats).toEqual([]);
  });

  it('takes superposition at lower potentials where ions of two charges balance the surface', () => {
    const ions = [
      { valence: 2, concentration_mol_m3: 5 },
      { valence: -1, concentration_mol_m3: 10 },
    ];
    const { model, reason } = chooseDoubleLayerModel({ ...pair, ions });
    expect(model).toBe('superposition');
    expect(reason).toMatch(/ions of higher charge/);
    expect(chooseDoubleLayerModel({ ...pair, ions, potential1_V: -0.004, potential2_V: -0.004 }).model).toBe(
      'constant-potential',
    );
  });

  it('takes superposition with curvature below κa of 5, whatever the potential', () => {
    const { model, reason, caveats } = chooseDoubleLayerModel({ ...pair, kappaRadiusSmaller: 3.2 });
    expect(model).toBe('superposition');
    expect(reason).toMatch(/curvature.*3\.2 Debye lengths/);
    expect(codes(caveats)).toEqual(['double-layer-curvature']);
  });

  it('takes superposition between κa of 5 and 10', () => {
    const { model, reason } = chooseDoubleLayerModel({ ...pair, kappaRadiusSmaller: 7 });
    expect(model).toBe('superposition');
    expect(reason).toMatch(/below the 10/);
  });

  it('counts the ends of its ranges as inside, and moves kT/e with the temperature', () => {
    const curved = (kappaRadiusSmaller: number) =>
      codes(chooseDoubleLayerModel({ ...pair, kappaRadiusSmaller }).caveats);
    expect(curved(4.99)).toEqual(['double-layer-curvature']);
    expect(curved(5)).toEqual([]);
    expect(chooseDoubleLayerModel({ ...pair, kappaRadiusSmaller: 10 }).model).toBe('constant-potential');
    expect(chooseDoubleLayerModel({ ...pair, temperature_K: 273 }).model).toBe('superposition');
  });

  it('refuses a potential that is no number', () => {
    expect(() => chooseDoubleLayerModel({ ...pair, potential2_V: Number.NaN })).toThrow(/potential2_V/);
  });
});

describe('chooseDoubleLayerModel by hand', () => {
  it.each(doubleLayerModels)('obeys %s, without a caveat inside its range', (choice) => {
    const { model, reason, caveats } = chooseDoubleLayerModel({ ...pair, choice });
    expect(model).toBe(choice);
    expect(reason).toMatch(/chosen by hand/);
    expect(caveats).toEqual([]);
  });

  it.each(['constant-potential', 'constant-charge'] as const)('obeys %s outside its range, with caveats', (choice) => {
    const { model, caveats } = chooseDoubleLayerModel({
      ...pair,
      choice,
      potential1_V: 0.06,
      kappaRadiusSmaller: 2,
    });
    expect(model).toBe(choice);
    expect(codes(caveats)).toEqual(['double-layer-model-range', 'double-layer-model-range']);
    expect(caveats[0].message).toMatch(/60 mV/);
    expect(caveats[1].message).toMatch(/2\.0/);
  });
});

describe('insideValidity', () => {
  const place = { ...pair, kappaGap: 1.5 };

  it.each(doubleLayerModels)('holds %s for inside, with numbers', (model) => {
    const { inside, note } = insideValidity(model, place);
    expect(inside).toBe(true);
    expect(note).toMatch(/24 mV.*1\.50 Debye lengths/);
  });

  it('tells strong overlap at the barrier apart by model', () => {
    const close = { ...place, kappaGap: 0.4 };
    expect(insideValidity('constant-potential', close).inside).toBe(true);
    expect(insideValidity('constant-charge', close)).toMatchObject({
      inside: false,
      note: expect.stringMatching(/overlap strongly at the barrier.*0\.40/),
    });
    expect(insideValidity('superposition', close)).toMatchObject({
      inside: false,
      note: expect.stringMatching(/between constant potential and constant charge/),
    });
  });

  it('gives all reasons at once', () => {
    const { inside, note } = insideValidity('constant-charge', {
      ...place,
      potential1_V: -0.08,
      kappaRadiusSmaller: 4,
      kappaGap: 0.1,
    });
    expect(inside).toBe(false);
    expect(note).toMatch(/80 mV.*4\.0.*0\.10/);
  });
});
