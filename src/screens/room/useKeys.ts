import { useEffect, useRef } from 'react';
import { type PageMs, pageMs } from '../../kernel/units.ts';
import { actionOf } from '../../model/keyMap.ts';
import type { KeyAction, KeyMap } from '../../model/observer.ts';

const typesText = 'input, textarea, select, [contenteditable]';

/**
 * Keyboard and page-turner: a key acts when it goes down, once. Keys are silent while `silent`, while something is
 * typed, and together with Ctrl, Alt or Meta. Enter and Space belong to a control that has the focus.
 */
export function useKeys(map: KeyMap, silent: boolean, act: (action: KeyAction, at: PageMs) => void): void {
  const latest = useRef({ map, silent, act });
  useEffect(() => {
    latest.current = { map, silent, act };
  });
  useEffect(() => {
    const down = (event: KeyboardEvent): void => {
      const { map, silent, act } = latest.current;
      if (silent || event.repeat || event.ctrlKey || event.metaKey || event.altKey) return;
      const target = event.target instanceof Element ? event.target : null;
      if (target?.closest(typesText)) return;
      if ((event.key === 'Enter' || event.key === ' ') && target?.closest('button, a')) return;
      const action = actionOf(map, event.key);
      if (action === null) return;
      event.preventDefault();
      act(action, pageMs(event.timeStamp));
    };
    window.addEventListener('keydown', down);
    return () => window.removeEventListener('keydown', down);
  }, []);
}
