import type { KeyAction, KeyMap } from '../../model/observer.ts';

/** The keys of an observer who has not chosen any: digits for codes, and the two keys of a page-turner. */
export const defaultKeys: KeyMap = {
  on: true,
  keys: {
    '1': 'code:1',
    '2': 'code:2',
    '3': 'code:3',
    '4': 'code:4',
    '5': 'code:5',
    '6': 'code:6',
    '0': 'cannot see',
    n: 'nothing',
    b: 'child before',
    Backspace: 'undo',
    s: 'silence',
    f: 'flag',
    PageUp: 'code:1',
    PageDown: 'code:2',
  },
};

/** Letters are the same key with and without the shift lock. */
const plain = (key: string): string => (key.length === 1 ? key.toLowerCase() : key);

/** What a key does, or null. */
export function actionOf(map: KeyMap, key: string): KeyAction | null {
  if (!map.on) return null;
  const found = Object.entries(map.keys).find(([name]) => plain(name) === plain(key));
  return found?.[1] ?? null;
}

/** The first key that does it, to be shown beside its target; null when there is none. */
export function keyOf(map: KeyMap, action: KeyAction): string | null {
  if (!map.on) return null;
  // Digits come first in a JavaScript object, so the short names win.
  return Object.entries(map.keys).find(([, does]) => does === action)?.[0] ?? null;
}
