import { createContext } from 'preact';
import { useContext } from 'preact/hooks';
import type { DeskTop } from '../state/deskTop';

const DeskTopContext = createContext<DeskTop | null>(null);

export const DeskTopProvider = DeskTopContext.Provider;

export function useDeskTop(): DeskTop {
  const deskTop = useContext(DeskTopContext);
  if (deskTop === null) throw new Error('useDeskTop: no DeskTopProvider above');
  return deskTop;
}
