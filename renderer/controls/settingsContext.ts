import { createContext } from 'preact';
import { useContext } from 'preact/hooks';
import type { Settings } from '../state/settings';

const SettingsContext = createContext<Settings | null>(null);

export const SettingsProvider = SettingsContext.Provider;

export function useSettings(): Settings {
  const settings = useContext(SettingsContext);
  if (settings === null) throw new Error('useSettings: no SettingsProvider above');
  return settings;
}
