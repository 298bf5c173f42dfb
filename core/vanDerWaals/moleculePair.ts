import { debyeInduction } from './debyeInduction';
import { keesom } from './keesom';
import { london } from './london';

export interface Molecule {
  readonly polarizabilityVolume_m3: number;
  readonly ionizationEnergy_J: number;
  readonly dipoleMoment_C_m: number;
}

/** Coefficients of −C/r⁶ [J m⁶] and their shares in percent of the total. */
export interface MoleculePairAttraction {
  readonly dispersion_J_m6: number;
  readonly orientation_J_m6: number;
  readonly induction_J_m6: number;
  readonly total_J_m6: number;
  readonly dispersion_percent: number;
  readonly orientation_percent: number;
  readonly induction_percent: number;
}

/**
 * The van der Waals attraction of two molecules in a gas, split by origin:
 *
 *     C = C(London) + C(Keesom) + C(Debye)
 *
 * Source  Israelachvili, Intermolecular and Surface Forces, 3rd ed. 2011, section 6.6 (from memory).
 * Valid   see the three laws.
 */
export function moleculePair(first: Molecule, second: Molecule, temperature_K: number): MoleculePairAttraction {
  const dispersion_J_m6 = london({
    polarizabilityVolume1_m3: first.polarizabilityVolume_m3,
    polarizabilityVolume2_m3: second.polarizabilityVolume_m3,
    ionizationEnergy1_J: first.ionizationEnergy_J,
    ionizationEnergy2_J: second.ionizationEnergy_J,
  });
  const dipoles = { dipoleMoment1_C_m: first.dipoleMoment_C_m, dipoleMoment2_C_m: second.dipoleMoment_C_m };
  const orientation_J_m6 = keesom({ ...dipoles, temperature_K });
  const induction_J_m6 = debyeInduction({
    ...dipoles,
    polarizabilityVolume1_m3: first.polarizabilityVolume_m3,
    polarizabilityVolume2_m3: second.polarizabilityVolume_m3,
  });
  const total_J_m6 = dispersion_J_m6 + orientation_J_m6 + induction_J_m6;
  return {
    dispersion_J_m6,
    orientation_J_m6,
    induction_J_m6,
    total_J_m6,
    dispersion_percent: (100 * dispersion_J_m6) / total_J_m6,
    orientation_percent: (100 * orientation_J_m6) / total_J_m6,
    induction_percent: (100 * induction_J_m6) / total_J_m6,
  };
}
