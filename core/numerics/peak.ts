const GOLDEN = (Math.sqrt(5) - 1) / 2;

/**
 * Place of the maximum of a function with one peak between `from` and `to`, to a width of `tolerance` in x. Closer than
 * about 1e-8 of the peak's own width the function no longer changes in a double. Golden section; source: Kiefer 1953
 * (from memory).
 */
export function placeOfMaximum(f: (x: number) => number, from: number, to: number, tolerance: number): number {
  let low = from;
  let high = to;
  let left = high - GOLDEN * (high - low);
  let right = low + GOLDEN * (high - low);
  let atLeft = f(left);
  let atRight = f(right);
  while (high - low > tolerance) {
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
