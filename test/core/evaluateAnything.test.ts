import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { evaluate } from '../../core/evaluate';
import { materials } from '../../core/materials/catalogue';
import { salts } from '../../core/medium/salts';
import { limitsOf, type QuantityKind } from '../../core/quantities/quantityKinds';
import {
  doubleLayerModels,
  type Formulation,
  hamakerRoutes,
  type Particle,
  SCENARIO_FORMAT,
  type Scenario,
} from '../../core/scenario/scenario';

/** Any number a file may hold, the ends of its range included; sizes and the like over all decades. */
const quantity = (kind: QuantityKind): fc.Arbitrary<number> => {
  const { min, max } = limitsOf(kind);
  const even = fc.double({ min, max, noNaN: true });
  const byDecade = min > 0 ? fc.double({ min: Math.log(min), max: Math.log(max), noNaN: true }).map(Math.exp) : even;
  return fc.oneof(even, byDecade, fc.constantFrom(min, max)).map((value) => Math.min(Math.max(value, min), max));
};
const idOf = (kinds: readonly string[]) =>
  fc.constantFrom(...materials.filter(({ kind }) => kinds.includes(kind)).map(({ id }) => id));

const particle: fc.Arbitrary<Particle> = fc.record({
  name: fc.constant('p'),
  material: idOf(['pigment', 'filler', 'polymer']),
  diameter_nm: quantity('diameter_nm'),
  loadingBasis: fc.constantFrom('volume' as const, 'mass' as const),
  loading_percent: quantity('loading_percent'),
  density_kg_m3: fc.option(quantity('density_kg_m3')),
  charge: fc.option(
    fc.record({
      zeta_mV: quantity('zeta_mV'),
      zetaUncertainty_mV: quantity('zetaUncertainty_mV'),
      slipPlane_nm: quantity('slipPlane_nm'),
    }),
  ),
  layer: fc.option(
    fc.record({
      thickness_nm: quantity('layerThickness_nm'),
      adsorbedAmount_mg_m2: quantity('adsorbedAmount_mg_m2'),
      chainMolarMass_g_mol: quantity('chainMolarMass_g_mol'),
      polymerDensity_kg_m3: quantity('polymerDensity_kg_m3'),
      floryChi: quantity('floryChi'),
    }),
  ),
});

const formulation: fc.Arbitrary<Formulation> = fc.record({
  id: fc.constant('f1'),
  name: fc.constant('f'),
  copiedFrom: fc.constant(null),
  temperature_degC: quantity('temperature_degC'),
  medium: fc.record({
    components: fc.array(
      fc.record({
        material: idOf(['solvent', 'polymer']),
        volumeParts: fc.double({ min: 0.01, max: 1e6, noNaN: true }),
      }),
      { minLength: 1, maxLength: 3 },
    ),
    measuredRelativePermittivity: fc.option(quantity('relativePermittivity')),
    measuredViscosity_mPa_s: fc.option(quantity('viscosity_mPa_s')),
    measuredDensity_kg_m3: fc.option(quantity('mediumDensity_kg_m3')),
  }),
  salts: fc.array(
    fc.record({
      salt: fc.constantFrom(...salts.map(({ id }) => id)),
      concentration_mM: quantity('concentration_mM'),
    }),
    { maxLength: 3 },
  ),
  hardness_dH: quantity('hardness_dH'),
  pH: fc.option(quantity('pH')),
  particles: fc.array(particle, { minLength: 1, maxLength: 2 }),
  hamaker: fc.record({ route: fc.constantFrom(...hamakerRoutes), entered_zJ: quantity('entered_zJ') }),
  doubleLayerModel: fc.constantFrom('by-validity' as const, ...doubleLayerModels),
});

const scenario: fc.Arbitrary<Scenario> = fc.record({
  format: fc.constant(SCENARIO_FORMAT),
  schema: fc.constant(1 as const),
  title: fc.constant(''),
  notes: fc.constant(''),
  requirement: fc.record({
    shelfLife_days: quantity('shelfLife_days'),
    acceptedLoss_percent: quantity('acceptedLoss_percent'),
    fillHeight_mm: quantity('fillHeight_mm'),
    acceptedClearLayer_percent: quantity('acceptedClearLayer_percent'),
  }),
  formulations: fc.tuple(formulation),
});

const MAY_BE_INFINITE = /\/(halfLife_s|timeToClear_s)$/;

/** Places of numbers that are none. */
function faultsIn(value: unknown, at = ''): string[] {
  if (typeof value === 'number') {
    const fine = MAY_BE_INFINITE.test(at) ? !Number.isNaN(value) : Number.isFinite(value);
    return fine ? [] : [`${at} is ${value}`];
  }
  if (typeof value !== 'object' || value === null) return [];
  return Object.entries(value).flatMap(([key, entry]) => faultsIn(entry, `${at}/${key}`));
}

describe('evaluate on any scenario a file may hold', () => {
  it('gives finite numbers or a refusal in words, and never fails', () => {
    fc.assert(
      fc.property(scenario, (one) => {
        const [outcome] = evaluate(one).formulations;
        if (outcome?.kind === 'refused') expect(outcome.problems.length).toBeGreaterThan(0);
        else expect(faultsIn(outcome)).toEqual([]);
      }),
      { numRuns: Number(process.env.FC_RUNS ?? 60), interruptAfterTimeLimit: 50_000, markInterruptAsFailure: false },
    );
  });
});
