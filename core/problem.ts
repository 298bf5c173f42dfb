/** Something the user can mend: a wrong entry or a bad file. Never an exception. */
export interface Problem {
  /** Stable key for tests and for the interface, for example `out-of-range`. */
  readonly code: string;
  /** JSON pointer (RFC 6901) into the scenario: `/formulations/0/particles/0/diameter_nm`. */
  readonly at: string;
  /** One sentence: what is wrong and what was expected. */
  readonly message: string;
  /** One sentence: what to do. */
  readonly remedy: string;
}

export type Result<T> =
  | { readonly ok: true; readonly value: T }
  | { readonly ok: false; readonly problems: readonly Problem[] };

export const done = <T>(value: T): Result<T> => ({ ok: true, value });
export const refused = (...problems: readonly Problem[]): Result<never> => ({ ok: false, problems });
