import { useSettings } from '../useCurrentStudy.ts';

/** Eyes-up and the cover are dim, so that the glass lights up no face; unless somebody has chosen the light theme. */
export function useDimGlass(): 'glass-dim' | '' {
  return useSettings()?.theme === 'light' ? '' : 'glass-dim';
}
