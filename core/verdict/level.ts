import type { VerdictLevel } from '../evaluation';

const order: readonly VerdictLevel[] = ['holds', 'borderline', 'fails'];

export const worstOf = (levels: readonly VerdictLevel[]): VerdictLevel =>
  levels.reduce<VerdictLevel>((worst, level) => (order.indexOf(level) > order.indexOf(worst) ? level : worst), 'holds');

/** A margin smaller than its own doubt decides nothing. */
export function levelOf(margin: number, downwardDoubt: number, upwardDoubt: number): VerdictLevel {
  if (margin >= downwardDoubt) return 'holds';
  return -margin > upwardDoubt ? 'fails' : 'borderline';
}
