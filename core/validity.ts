/** Range in which a formula is trusted, ends included. */
export interface Span {
  readonly from: number;
  readonly to: number;
}

/** A doubt about a number that is still given. Shown wherever the number is shown. */
export interface Caveat {
  /** Stable key, for example `debye-length-range`. */
  readonly code: string;
  /** One or two sentences a formulator understands. */
  readonly message: string;
}

export const isWithin = (span: Span, value: number): boolean => value >= span.from && value <= span.to;

/**
 * Guards a formula against a programming error: scenario values are checked at the door, so a throw here is our bug.
 * Throws RangeError naming the function and the first input that is not a finite number above zero.
 */
export function mustBePositive(where: string, inputs: Readonly<Record<string, number>>): void {
  for (const [name, value] of Object.entries(inputs)) {
    if (!(value > 0) || !Number.isFinite(value)) {
      throw new RangeError(`${where}: ${name} must be a finite number above zero, got ${value}`);
    }
  }
}

/** As {@link mustBePositive}, for quantities that may be zero. */
export function mustNotBeNegative(where: string, inputs: Readonly<Record<string, number>>): void {
  for (const [name, value] of Object.entries(inputs)) {
    if (!(value >= 0) || !Number.isFinite(value)) {
      throw new RangeError(`${where}: ${name} must be a finite number, zero or above, got ${value}`);
    }
  }
}

/** As {@link mustBePositive}, for quantities of either sign. */
export function mustBeFinite(where: string, inputs: Readonly<Record<string, number>>): void {
  for (const [name, value] of Object.entries(inputs)) {
    if (!Number.isFinite(value)) throw new RangeError(`${where}: ${name} must be a finite number, got ${value}`);
  }
}
