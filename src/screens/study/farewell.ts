import { createContext, useContext } from 'react';
import type { Doing } from './useDoing.tsx';

/** What a page says when it has taken itself away: shown at a glance, with the way back. */
export const FarewellContext = createContext<Doing | null>(null);

export function useFarewell(): Doing {
  const doing = useContext(FarewellContext);
  if (doing === null) throw new Error('A page of the study was rendered outside of it.');
  return doing;
}
