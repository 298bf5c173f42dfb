/** Numbers inside verdict sentences: few digits, no exponent a formulator would have to decode. */

export function number(value: number, digits = 3): string {
  const rounded = Number(value.toPrecision(digits));
  const text = Math.abs(rounded) >= 1e6 ? rounded.toExponential(digits - 1) : String(rounded);
  return text.replace('-', '−').replace('e+', ' × 10^');
}

const MINUTE_s = 60;
const HOUR_s = 3600;
const DAY_s = 86_400;
const MONTH_s = 30.4375 * DAY_s; // 365.25 days over 12
const YEAR_s = 365.25 * DAY_s;

/** A time span from its decimal logarithm in seconds, so that spans beyond the number range can be said too. */
export function timeSpan(log10Time_s: number): string {
  if (log10Time_s > Math.log10(1000 * YEAR_s)) return 'more than 1000 years';
  const time_s = 10 ** log10Time_s;
  if (time_s < 1e-3) return 'less than a millisecond';
  if (time_s < 1) return `${number(1000 * time_s, 2)} milliseconds`;
  if (time_s < 2 * MINUTE_s) return `${number(time_s, 2)} seconds`;
  if (time_s < 2 * HOUR_s) return `${number(time_s / MINUTE_s, 2)} minutes`;
  if (time_s < 2 * DAY_s) return `${number(time_s / HOUR_s, 2)} hours`;
  if (time_s < 2 * MONTH_s) return `${number(time_s / DAY_s, 2)} days`;
  if (time_s < 2 * YEAR_s) return `${number(time_s / MONTH_s, 2)} months`;
  return `${number(time_s / YEAR_s, 2)} years`;
}
