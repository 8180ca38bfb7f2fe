import type { KeyAction, KeyMap } from './observer.ts';

/**
 * The keys to begin with: digits for codes, letters for the rest, signs for headcounts, and the keys that page-turners send (page and
 * arrow keys) for the first two codes. Names of keys are those of `KeyboardEvent.key`, single characters in lower case.
 */
export function defaultKeyMap(): KeyMap {
  const keys: Record<string, KeyAction> = {
    '1': 'code:1',
    '2': 'code:2',
    '3': 'code:3',
    '4': 'code:4',
    '5': 'code:5',
    '6': 'code:6',
    '0': 'cannot see',
    n: 'nothing',
    b: 'child before',
    u: 'undo',
    Backspace: 'undo',
    s: 'silence',
    f: 'flag',
    c: 'cover',
    '+': 'one more',
    '-': 'one fewer',
    '=': 'same again',
    PageDown: 'code:1',
    ArrowRight: 'code:1',
    ArrowDown: 'code:1',
    PageUp: 'code:2',
    ArrowLeft: 'code:2',
    ArrowUp: 'code:2',
  };
  return { on: true, keys };
}

/** The name under which a key stands in a key map: capital letters count as small ones. */
export function keyName(key: string): string {
  return [...key].length === 1 ? key.toLowerCase() : key;
}

/** Keys that move through a page, work its buttons or belong to the system: they never get a meaning in the room. */
const kept = new Set([
  ' ',
  'Alt',
  'AltGraph',
  'CapsLock',
  'Control',
  'Dead',
  'Enter',
  'Escape',
  'Fn',
  'Meta',
  'Process',
  'Shift',
  'Tab',
  'Unidentified',
]);

/** False for keys that a page or the system needs for itself. */
export const mayMean = (key: string): boolean => !kept.has(keyName(key));

/** What a key does for this observer (null: the keys to begin with); null for nothing, and where keys are off. */
export function actionOf(map: KeyMap | null, key: string): KeyAction | null {
  const { on, keys } = map ?? defaultKeyMap();
  const name = keyName(key);
  return on && Object.hasOwn(keys, name) ? (keys[name] ?? null) : null;
}

/** The key to be shown beside a target: the first one that does it (digits come first); null for none, and where keys are off. */
export function keyOf(map: KeyMap | null, action: KeyAction): string | null {
  const { on, keys } = map ?? defaultKeyMap();
  if (!on) return null;
  return Object.entries(keys).find(([, does]) => does === action)?.[0] ?? null;
}
