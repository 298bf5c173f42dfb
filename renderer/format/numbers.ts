import { type DecimalSign, writeQuantity } from '../../core/quantities/writeQuantity';

/** Stands where there is no value; its reason stands beside it. */
export const NO_VALUE = '–';

/** A number with few digits, a true minus and the user's decimal sign. */
export const shortNumber = (value: number | null, decimalSign: DecimalSign, digits = 3): string =>
  value === null || !Number.isFinite(value) ? NO_VALUE : writeQuantity(value, { unit: '', digits, decimalSign });

export const withUnit = (value: number | null, unit: string, decimalSign: DecimalSign, digits = 3): string =>
  value === null || !Number.isFinite(value) ? NO_VALUE : writeQuantity(value, { unit, digits, decimalSign });

/** A number to edit: all its digits, since what is shown is what is kept. */
export const editedNumber = (value: number, decimalSign: DecimalSign): string => {
  const plain = String(value).replace('-', '−');
  return decimalSign === ',' ? plain.replace('.', ',') : plain;
};
