import { ZERO_CELSIUS_K } from '../constants';

/**
 * The only conversions in core: from the unit of a scenario to SI at the door, and back where results are shown.
 * Named TO_from_FROM, so that a wrong one looks wrong.
 */
const SECONDS_PER_DAY = 86_400;

/** Throws for NaN: it never travels further. Infinity may pass: some times are infinite. */
function mustBeANumber(value: number): void {
  if (Number.isNaN(value)) throw new RangeError('convert: the value must be a number, got NaN');
}

/** Moves the decimal point. Multiplying by 1e-9 would round twice: 240 nm would become 2.4000000000000003e-7 m. */
function shifted(value: number, places: number): number {
  mustBeANumber(value);
  if (!Number.isFinite(value)) return value;
  const [digits, exponent] = value.toExponential().split('e');
  return Number(`${digits}e${Number(exponent) + places}`);
}

/** Removes what the binary sum adds beyond the 15 digits that every double keeps of a decimal. */
function decimal(value: number): number {
  mustBeANumber(value);
  return Number.isFinite(value) ? Number(value.toPrecision(15)) : value;
}

export const m_from_nm = (length_nm: number): number => shifted(length_nm, -9);
export const nm_from_m = (length_m: number): number => shifted(length_m, 9);
export const m_from_mm = (length_mm: number): number => shifted(length_mm, -3);
export const mm_from_m = (length_m: number): number => shifted(length_m, 3);
export const m_from_um = (length_um: number): number => shifted(length_um, -6);
export const um_from_m = (length_m: number): number => shifted(length_m, 6);

export const V_from_mV = (potential_mV: number): number => shifted(potential_mV, -3);
export const mV_from_V = (potential_V: number): number => shifted(potential_V, 3);

export const K_from_degC = (temperature_degC: number): number => decimal(temperature_degC + ZERO_CELSIUS_K);
/** Twelve decimals: the difference of two near numbers keeps fewer digits than each of them. */
export const degC_from_K = (temperature_K: number): number => {
  mustBeANumber(temperature_K);
  return Number((temperature_K - ZERO_CELSIUS_K).toFixed(12));
};

/** 1 mM is 1 mol/m³: named, so that the reader need not know. */
export const mol_m3_from_mM = (concentration_mM: number): number => shifted(concentration_mM, 0);
export const mM_from_mol_m3 = (concentration_mol_m3: number): number => shifted(concentration_mol_m3, 0);

export const kg_m2_from_mg_m2 = (amount_mg_m2: number): number => shifted(amount_mg_m2, -6);
export const mg_m2_from_kg_m2 = (amount_kg_m2: number): number => shifted(amount_kg_m2, 6);

export const kg_mol_from_g_mol = (molarMass_g_mol: number): number => shifted(molarMass_g_mol, -3);
export const g_mol_from_kg_mol = (molarMass_kg_mol: number): number => shifted(molarMass_kg_mol, 3);

export const Pa_s_from_mPa_s = (viscosity_mPa_s: number): number => shifted(viscosity_mPa_s, -3);
export const mPa_s_from_Pa_s = (viscosity_Pa_s: number): number => shifted(viscosity_Pa_s, 3);

export const s_from_days = (time_days: number): number => decimal(time_days * SECONDS_PER_DAY);
export const days_from_s = (time_s: number): number => decimal(time_s / SECONDS_PER_DAY);

export const J_from_zJ = (energy_zJ: number): number => shifted(energy_zJ, -21);
export const zJ_from_J = (energy_J: number): number => shifted(energy_J, 21);

export const fraction_from_percent = (share_percent: number): number => shifted(share_percent, -2);
export const percent_from_fraction = (share: number): number => shifted(share, 2);
