/** Spreadsheets run a cell that begins like a formula. Text gets an apostrophe in front; numbers stay numbers. */
const startsLikeAFormula = /^[=+\-@\t\r＝＋－＠]/u;

const cell = (value: number | string | null, separator: string): string => {
  if (value === null) return '';
  if (typeof value === 'number') return Number.isFinite(value) ? String(value) : '';
  const safe = startsLikeAFormula.test(value) ? `'${value}` : value;
  if (separator === '\t') return safe.replace(/[\t\r\n]+/g, ' ');
  return /[",\r\n;]/.test(safe) ? `"${safe.replaceAll('"', '""')}"` : safe;
};

/** Rows as CSV (RFC 4180, comma) or TSV for the clipboard. Decimal point always. */
export function delimited(rows: readonly (readonly (number | string | null)[])[], separator: ',' | '\t'): string {
  const lineEnd = separator === ',' ? '\r\n' : '\n';
  return rows.map((row) => row.map((value) => cell(value, separator)).join(separator) + lineEnd).join('');
}
