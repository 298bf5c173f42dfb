import { useEffect, useState } from 'preact/hooks';
import { useSettings } from '../controls/settingsContext';

const query = '(prefers-color-scheme: dark)';

/** Whether the window is dark now: the system's wish, unless the user has chosen. */
export function useDark(): boolean {
  const theme = useSettings().theme.value;
  const [systemDark, setSystemDark] = useState(() => matchMedia(query).matches);
  useEffect(() => {
    const media = matchMedia(query);
    const follow = () => setSystemDark(media.matches);
    media.addEventListener('change', follow);
    return () => media.removeEventListener('change', follow);
  }, []);
  return theme === 'system' ? systemDark : theme === 'dark';
}
