import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { pairDoubt } from '../../../core/formulation/doubt';
import type { Formulation } from '../../../core/scenario/scenario';
import { charge, layer, solved, whiteBase, withParticles } from './whiteBase';

const doubtOf = (formulation: Formulation) => pairDoubt(formulation, solved(formulation), 0);
const effects = (formulation: Formulation) =>
  new Map(doubtOf(formulation).barrier.contributions.map(({ input, effect_kT }) => [input, effect_kT]));
const effectOf = (formulation: Formulation, input: 'zeta' | 'size' | 'ionicStrength' | 'hamakerConstant'): number =>
  effects(formulation).get(input) ?? Number.NaN;
const withZetaDoubt = (zetaUncertainty_mV: number, zeta_mV = -40): Formulation =>
  withParticles({ charge: { ...charge, zeta_mV, zetaUncertainty_mV } });

describe('the contributions to the doubt of a barrier', () => {
  it('doubling a small uncertainty of zeta doubles its contribution (1e-3: the barrier is not quite linear)', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0.01, max: 0.5, noNaN: true }),
        fc.double({ min: 30, max: 70, noNaN: true }),
        (small_mV, zeta_mV) => {
          const once = effectOf(withZetaDoubt(small_mV, zeta_mV), 'zeta');
          const twice = effectOf(withZetaDoubt(2 * small_mV, zeta_mV), 'zeta');
          expect(Math.abs(twice / once - 2)).toBeLessThan(2e-3);
        },
      ),
      { numRuns: 20 },
    );
  });

  it('is the slope of the barrier with zeta times the uncertainty', () => {
    const at = (zeta_mV: number) => solved(withZetaDoubt(5, zeta_mV)).pairs[0].features.barrier?.energy_kT ?? 0;
    const slope_kT_mV = at(-40.5) - at(-39.5);
    expect(Math.abs(effectOf(withZetaDoubt(0.5), 'zeta') / (0.5 * slope_kT_mV) - 1)).toBeLessThan(1e-3);
  });

  it.each([
    ['charged', whiteBase],
    ['charged and covered', withParticles({ layer })],
    ['covered', withParticles({ charge: null, layer })],
    ['two kinds', withParticles({}, { diameter_nm: 120, charge: { ...charge, zeta_mV: -20 } })],
  ])('stand largest first: %s', (_, formulation) => {
    const sizes = doubtOf(formulation).barrier.contributions.map(({ effect_kT }) => effect_kT);
    expect(sizes.length).toBeGreaterThan(1);
    expect(sizes).toEqual([...sizes].sort((a, b) => b - a));
    expect(sizes.every((size) => size >= 0 && Number.isFinite(size))).toBe(true);
  });

  it.each([
    ['charge and salt', whiteBase, ['hamakerConstant', 'ionicStrength', 'size', 'zeta']],
    ['charge without salt', { ...whiteBase, salts: [] }, ['hamakerConstant', 'size', 'zeta']],
    ['hard water', { ...whiteBase, salts: [], hardness_dH: 10 }, ['hamakerConstant', 'ionicStrength', 'size', 'zeta']],
    [
      'a layer alone',
      withParticles({ charge: null, layer }),
      ['floryChi', 'hamakerConstant', 'layerThickness', 'size'],
    ],
    ['nothing that repels', withParticles({ charge: null }), ['hamakerConstant', 'size']],
  ])('name what the pair depends on, and no more: %s', (_, formulation, inputs) => {
    expect([...effects(formulation).keys()].sort()).toEqual(inputs);
  });

  it('say by how much each input was moved', () => {
    const changes = new Map(
      doubtOf(whiteBase).barrier.contributions.map(({ input, change }) => [input, change] as const),
    );
    expect(changes.get('zeta')).toBe('±5 mV');
    expect(changes.get('ionicStrength')).toBe('±20 %');
    expect(changes.get('size')).toBe('±10 %');
  });
});

describe('the doubt of the whole', () => {
  it('is the root of the sum of squares where the barrier is nearly linear', () => {
    const { barrier } = doubtOf(withZetaDoubt(1));
    const squares = barrier.contributions.reduce((sum, { effect_kT }) => sum + effect_kT ** 2, 0);
    expect(Math.abs(barrier.standardUncertainty_kT / Math.sqrt(squares) - 1)).toBeLessThan(0.01);
  });

  it('spans the barrier, reaches farther up than down for a large doubt of zeta, and never below zero', () => {
    const { barrier, log10WDown, log10WUp } = doubtOf(withZetaDoubt(15));
    const here_kT = solved(withZetaDoubt(15)).pairs[0].features.barrier?.energy_kT ?? 0;
    expect(barrier.low_kT).toBeLessThan(here_kT);
    expect(barrier.high_kT - here_kT).toBeGreaterThan(here_kT - barrier.low_kT);
    expect(log10WUp).toBeGreaterThan(log10WDown);
    expect(doubtOf(withZetaDoubt(39)).barrier.low_kT).toBeGreaterThanOrEqual(0);
  });

  it('grows with the doubt of zeta, and does not ask for its sign', () => {
    const of = (uncertainty_mV: number, zeta_mV = -40) =>
      doubtOf(withZetaDoubt(uncertainty_mV, zeta_mV)).barrier.standardUncertainty_kT;
    expect(of(2)).toBeLessThan(of(5));
    expect(of(5)).toBeLessThan(of(10));
    expect(of(5, 40)).toBeCloseTo(of(5, -40), 9);
  });

  it('in decades is that in kT over ln 10, within a tenth: ln W follows the barrier', () => {
    const { barrier } = doubtOf(whiteBase);
    const ratio = (barrier.standardUncertaintyLog10W * Math.LN10) / barrier.standardUncertainty_kT;
    expect(Math.abs(ratio - 1)).toBeLessThan(0.1);
  });

  it('of the outer well comes out above zero where there is one, and zero where there is none', () => {
    expect(solved(whiteBase).pairs[0].features.outerMinimum).not.toBeNull();
    expect(doubtOf(whiteBase).outerMinimum_kT).toBeGreaterThan(0);
    expect(doubtOf(withParticles({ charge: null })).outerMinimum_kT).toBe(0);
  });

  it('stays a number for walls that no heat climbs', () => {
    const { barrier, log10WDown, log10WUp } = doubtOf(withParticles({ charge: null, layer, diameter_nm: 2000 }));
    expect(log10WDown).toBeLessThanOrEqual(300);
    expect(log10WUp).toBeLessThanOrEqual(300);
    expect(Number.isFinite(barrier.standardUncertaintyLog10W)).toBe(true);
  });
});
