import type { Settings } from '../tasks/ports.ts';

/** Puts the chosen colours on the page; "system" follows the tablet and keeps following it. */
export function applyTheme(root: HTMLElement, dark: MediaQueryList): (theme: Settings['theme']) => void {
  let chosen: Settings['theme'] = 'system';
  const put = (): void => {
    const dim = chosen === 'dim' || (chosen === 'system' && dark.matches);
    root.dataset.theme = dim ? 'dim' : 'light';
  };
  dark.addEventListener('change', put);
  put();
  return (theme) => {
    chosen = theme;
    put();
  };
}
