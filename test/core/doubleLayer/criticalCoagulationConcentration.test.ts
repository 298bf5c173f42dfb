import { describe, expect, it } from 'vitest';
import {
  criticalCoagulationConcentration,
  hamakerConstantFromCoagulation,
} from '../../../core/doubleLayer/criticalCoagulationConcentration';
import { debyeLength } from '../../../core/doubleLayer/debyeLength';
import { gregorySuperpositionEnergy } from '../../../core/doubleLayer/gregorySuperposition';
import { K_from_degC } from '../../../core/quantities/convert';
import { coagulationCoefficient } from '../../published/shaw1992Coagulation';
import reference from '../../reference/doubleLayer/coagulation.json';

describe('criticalCoagulationConcentration', () => {
  it.each(reference.concentration)('$id: $concentration_mol_m3 mol/m³ (separate program, 1e-6)', (row) => {
    expect(Math.abs(criticalCoagulationConcentration(row) / row.concentration_mol_m3 - 1)).toBeLessThan(1e-6);
  });

  it(`${reference.inverse.id}: the Hamaker constant from the concentration, and back`, () => {
    const hamakerConstant_J = hamakerConstantFromCoagulation(reference.inverse);
    expect(Math.abs(hamakerConstant_J / reference.inverse.hamakerConstant_J - 1)).toBeLessThan(1e-6);
    const again_mol_m3 = criticalCoagulationConcentration({ ...reference.inverse, hamakerConstant_J });
    expect(again_mol_m3).toBeCloseTo(reference.inverse.concentration_mol_m3, 10);
  });

  it('has the coefficient 3.84e-39 (Shaw 1992, from memory, three digits; cube of a permittivity not given)', () => {
    const { relativePermittivity, temperature_degC, coefficient_mol_L_J2 } = coagulationCoefficient;
    const ours_mol_m3 = criticalCoagulationConcentration({
      hamakerConstant_J: 1e-20,
      potential_V: 5, // γ = 1
      valence: 1,
      relativePermittivity,
      temperature_K: K_from_degC(temperature_degC),
    });
    // 1 % in ε makes 3 % in c; with 78.5 we are within one.
    expect(Math.abs(ours_mol_m3 / 1000 / (coefficient_mol_L_J2 / 1e-40) - 1)).toBeLessThan(0.01);
  });

  it('falls as z⁻⁶ at high potential and as z⁻² at low potential', () => {
    const at = (potential_V: number, valence: number) =>
      criticalCoagulationConcentration({
        hamakerConstant_J: 1e-20,
        potential_V,
        valence,
        relativePermittivity: 78.3,
        temperature_K: 298.15,
      });
    expect(at(5, 1) / at(5, 2)).toBeCloseTo(64, 8);
    expect(at(1e-5, 1) / at(1e-5, 2)).toBeCloseTo(4, 5);
  });

  it('is where energy and force of superposition and attraction vanish together', () => {
    const row = reference.concentration[0];
    const kappa =
      1 / debyeLength({ ...row, ionicStrength_mol_m3: criticalCoagulationConcentration(row) * row.valence ** 2 });
    const radius_m = 1e-6;
    const total_J = (gap_m: number) =>
      gregorySuperpositionEnergy({
        gap_m,
        radius1_m: radius_m,
        radius2_m: radius_m,
        potential1_V: row.potential_V,
        potential2_V: row.potential_V,
        inverseDebyeLength_per_m: kappa,
        relativePermittivity: row.relativePermittivity,
        temperature_K: row.temperature_K,
        valence: row.valence,
      }) -
      (row.hamakerConstant_J * radius_m) / (12 * gap_m);
    const scale_J = (row.hamakerConstant_J * radius_m * kappa) / 12;
    expect(Math.abs(total_J(1 / kappa) / scale_J)).toBeLessThan(1e-12);
    for (const shift of [0.8, 0.95, 1.05, 1.3]) expect(total_J(shift / kappa)).toBeLessThan(0);
  });
});
