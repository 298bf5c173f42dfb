const GOLDEN = (Math.sqrt(5) - 1) / 2;

/**
 * Place of the maximum of a function with one peak between `from` and `to`, to a relative width of 1e-7 (half the digits
 * of a double: closer, the function no longer changes). Golden section; source: Kiefer 1953 (from memory).
 */
export function placeOfMaximum(f: (x: number) => number, from: number, to: number): number {
  let low = from;
  let high = to;
  let left = high - GOLDEN * (high - low);
  let right = low + GOLDEN * (high - low);
  let atLeft = f(left);
  let atRight = f(right);
  while (high - low > 1e-7 * Math.max(Math.abs(low), Math.abs(high))) {
    if (atLeft > atRight) {
      high = right;
      right = left;
      atRight = atLeft;
      left = high - GOLDEN * (high - low);
      atLeft = f(left);
    } else {
      low = left;
      left = right;
      atLeft = atRight;
      right = low + GOLDEN * (high - low);
      atRight = f(right);
    }
  }
  return (low + high) / 2;
}
