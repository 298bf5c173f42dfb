import { effect, type Signal, signal } from '@preact/signals';
import type { DecimalSign } from '../../core/quantities/writeQuantity';

export type Theme = 'system' | 'light' | 'dark';

/** How this person likes to see things; kept on this machine, never in scenario files. */
export interface Settings {
  readonly theme: Signal<Theme>;
  readonly decimalSign: Signal<DecimalSign>;
}

const themes: readonly Theme[] = ['system', 'light', 'dark'];

const signOf = (language: string): DecimalSign =>
  new Intl.NumberFormat(language).formatToParts(1.5).some((part) => part.type === 'decimal' && part.value === ',')
    ? ','
    : '.';

/** Storage may be forbidden or full: then the settings last as long as the window. */
function remembered(key: string): string | null {
  try {
    return localStorage.getItem(key);
  } catch {
    return null;
  }
}

function remember(key: string, value: string): void {
  try {
    localStorage.setItem(key, value);
  } catch {
    // Nothing is lost but a preference.
  }
}

export function createSettings(): Settings {
  const theme = signal<Theme>(themes.find((one) => one === remembered('theme')) ?? 'system');
  const known = remembered('decimalSign');
  const decimalSign = signal<DecimalSign>(known === ',' || known === '.' ? known : signOf(navigator.language));
  effect(() => {
    remember('theme', theme.value);
    document.documentElement.dataset.theme = theme.value;
  });
  effect(() => remember('decimalSign', decimalSign.value));
  return { theme, decimalSign };
}
