import { BOLTZMANN_J_K, ELEMENTARY_CHARGE_C, VACUUM_PERMITTIVITY_F_m } from '../constants';
import { nm_from_m } from '../quantities/convert';
import type { SaltDose } from '../scenario/scenario';
import { type Caveat, isWithin } from '../validity';
import type { Ions } from './ionsOf';
import { findSalt } from './salts';
import { waterIonProductValidity_K } from './waterIonProduct';

/** Poisson–Boltzmann treats ions as points; beyond 0.5 mol/L, or three charges, they are not. Rules of thumb. */
const POINT_IONS_BELOW_mol_m3 = 500;
const HIGH_VALENCE = 3;
/** Highly charged ions that make up less than this of the ionic strength are passed over. */
const WORTH_MENTIONING = 0.01;
/** Below this permittivity most salt is present as pairs: two ions in contact at 0.4 nm are bound by nearly 10 kT. */
const PAIRING_BELOW = 15;

interface IonCircumstances {
  readonly salts: readonly SaltDose[];
  readonly pH: number | null;
  readonly hasWater: boolean;
  readonly relativePermittivity: number;
  readonly temperature_K: number;
}

/** What is doubtful about the ions found by `ionsOf`. */
export function ionCaveats(found: Ions, circumstances: IonCircumstances): readonly Caveat[] {
  const { salts, pH, hasWater, relativePermittivity, temperature_K } = circumstances;
  const { ions, ionicStrength_mol_m3 } = found;
  const caveats: Caveat[] = [];

  if (ionicStrength_mol_m3 > POINT_IONS_BELOW_mol_m3) {
    caveats.push({
      code: 'ionic-strength-high',
      message: `The ionic strength is ${(ionicStrength_mol_m3 / 1000).toFixed(2)} mol/L. Above 0.5 mol/L the size of the ions counts, and double-layer theory loses its meaning.`,
    });
  }
  const highlyCharged = ions.filter(
    ({ valence, concentration_mol_m3 }) =>
      Math.abs(valence) >= HIGH_VALENCE &&
      (concentration_mol_m3 * valence ** 2) / 2 > WORTH_MENTIONING * ionicStrength_mol_m3,
  );
  if (highlyCharged.length > 0) {
    caveats.push({
      code: 'highly-charged-ions',
      message: `${highlyCharged.map(({ name }) => name).join(', ')}: ions of three or more charges attract each other and bind to surfaces, which double-layer theory does not hold.`,
    });
  }
  if (relativePermittivity < PAIRING_BELOW && ionicStrength_mol_m3 > 0) {
    // λ_B = e²/(4π ε_r ε₀ k_B T), here only for the wording
    const bjerrumLength_m =
      ELEMENTARY_CHARGE_C ** 2 /
      (4 * Math.PI * relativePermittivity * VACUUM_PERMITTIVITY_F_m * BOLTZMANN_J_K * temperature_K);
    caveats.push({
      code: 'ion-pairs',
      message: `Salt in a medium of low permittivity (${relativePermittivity.toFixed(1)}) is mostly ion pairs: opposite charges hold together within ${nm_from_m(bjerrumLength_m).toFixed(1)} nm. Far fewer ions are free than were dosed, so screening is overstated.`,
    });
  }
  if (hasWater && pH === null) {
    caveats.push({
      code: 'ph-missing',
      message:
        'The medium holds water but no pH is given: acids and bases are taken as their formulas show, and H⁺ and OH⁻ of the water are left out.',
    });
  }
  if (!hasWater && pH !== null) {
    caveats.push({
      code: 'ph-without-water',
      message: 'The medium holds no water, so the pH given has no meaning and is left out.',
    });
  }
  if (hasWater && pH !== null && !isWithin(waterIonProductValidity_K, temperature_K)) {
    caveats.push({
      code: 'ion-product-range',
      message: 'The ion product of water is continued beyond 0–60 °C, where it was measured.',
    });
  }
  for (const id of new Set(salts.filter((dose) => dose.concentration_mM > 0).map((dose) => dose.salt))) {
    const salt = findSalt(id);
    if (salt !== undefined && salt.note !== null) {
      caveats.push({ code: `salt-${id}`, message: `${salt.name}: ${salt.note}` });
    }
  }
  return caveats;
}
