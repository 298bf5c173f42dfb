import * as mathjs from 'mathjs';
import { describe, expect, it } from 'vitest';
import * as constants from '../../core/constants';

const magnitude = (constant: mathjs.Unit, unit: string): number => constant.toNumber(unit);

/** Two doubles of the same constant may differ in the last bit where one is a product: 1e-15 allows four such steps. */
const SAME = 1e-15;

describe('the constants agree with those of mathjs 15.2.0 (CODATA 2018)', () => {
  it.each<[string, number, number]>([
    ['BOLTZMANN_J_K', constants.BOLTZMANN_J_K, magnitude(mathjs.boltzmann, 'J/K')],
    ['ELEMENTARY_CHARGE_C', constants.ELEMENTARY_CHARGE_C, magnitude(mathjs.elementaryCharge, 'C')],
    ['AVOGADRO_per_mol', constants.AVOGADRO_per_mol, magnitude(mathjs.avogadro, 'mol^-1')],
    ['PLANCK_J_s', constants.PLANCK_J_s, magnitude(mathjs.planckConstant, 'J s')],
    ['REDUCED_PLANCK_J_s', constants.REDUCED_PLANCK_J_s, magnitude(mathjs.reducedPlanckConstant, 'J s')],
    ['LIGHT_SPEED_m_s', constants.LIGHT_SPEED_m_s, magnitude(mathjs.speedOfLight, 'm/s')],
    ['GAS_CONSTANT_J_mol_K', constants.GAS_CONSTANT_J_mol_K, magnitude(mathjs.gasConstant, 'J/(K mol)')],
    ['FARADAY_C_mol', constants.FARADAY_C_mol, magnitude(mathjs.faraday, 'C/mol')],
    ['VACUUM_PERMITTIVITY_F_m', constants.VACUUM_PERMITTIVITY_F_m, magnitude(mathjs.electricConstant, 'F/m')],
    ['GRAVITY_m_s2', constants.GRAVITY_m_s2, magnitude(mathjs.gravity, 'm/s^2')],
  ])('%s', (_, ours, theirs) => {
    expect(Math.abs(ours / theirs - 1)).toBeLessThan(SAME);
  });

  it('but not with its electronvolt unit, which is of CODATA 2010: 1.602176565e-19 J', () => {
    const theirs_J = mathjs.unit('1 eV').toNumber('J');
    expect(theirs_J).toBeCloseTo(1.602176565e-19, 33);
    // 43 parts in a thousand million: small, yet a reason to keep a table of units of our own.
    expect(constants.ELEMENTARY_CHARGE_C / theirs_J - 1).toBeCloseTo(4.3e-8, 9);
  });
});

describe('the constants obey the relations that define them', () => {
  it('0 °C is 273.15 K', () => {
    expect(constants.ZERO_CELSIUS_K).toBe(273.15);
  });

  it('one debye is 3.33564e-30 C m (CODATA lists 3.335 640 951e-30 by this definition, from memory)', () => {
    expect(constants.DEBYE_C_m / 3.335640951e-30).toBeCloseTo(1, 9);
  });

  /** μ₀ is measured since 2019, within 1.5e-10 of 4π × 10⁻⁷ N/A² when the units were redefined; ten times that allowed. */
  it('ε₀ μ₀ c² = 1', () => {
    const permeability_N_A2 = 4 * Math.PI * 1e-7;
    const product = constants.VACUUM_PERMITTIVITY_F_m * permeability_N_A2 * constants.LIGHT_SPEED_m_s ** 2;
    expect(Math.abs(product - 1)).toBeLessThan(1.5e-9);
  });
});
