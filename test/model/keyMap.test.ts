import { describe, expect, test } from 'vitest';
import { actionOf, defaultKeyMap, keyName, keyOf, mayMean } from '../../src/model/keyMap.ts';
import { keyMap } from '../../src/model/observer.ts';

describe('the keys to begin with', () => {
  test('are a valid key map, switched on', () => {
    expect(keyMap.safeParse(defaultKeyMap()).success).toBe(true);
    expect(defaultKeyMap().on).toBe(true);
  });

  test('reach everything that a key can do', () => {
    const reached = new Set(Object.values(defaultKeyMap().keys));
    expect([...reached].sort()).toEqual(
      [
        ...[1, 2, 3, 4, 5, 6].map((n) => `code:${n}`),
        'cannot see',
        'nothing',
        'child before',
        'undo',
        'silence',
        'flag',
        'cover',
        'one more',
        'one fewer',
        'same again',
      ].sort(),
    );
  });

  test('give a page-turner two codes whichever keys it sends', () => {
    for (const key of ['PageDown', 'ArrowRight', 'ArrowDown']) expect(actionOf(null, key)).toBe('code:1');
    for (const key of ['PageUp', 'ArrowLeft', 'ArrowUp']) expect(actionOf(null, key)).toBe('code:2');
  });

  test('use no key that the page needs itself', () => {
    expect(Object.keys(defaultKeyMap().keys).filter((key) => !mayMean(key))).toEqual([]);
    for (const key of ['Tab', 'Enter', ' ', 'Escape', 'Shift']) expect(mayMean(key)).toBe(false);
  });

  test('stand under the names by which they are looked up', () => {
    for (const key of Object.keys(defaultKeyMap().keys)) expect(keyName(key)).toBe(key);
  });
});

describe('what a key does', () => {
  test('a capital letter is the same key', () => {
    expect(actionOf(null, 'U')).toBe('undo');
  });

  test('nothing when the keys are off, or for a key without meaning', () => {
    expect(actionOf({ ...defaultKeyMap(), on: false }, '1')).toBeNull();
    expect(actionOf(null, 'q')).toBeNull();
    expect(actionOf(null, 'constructor')).toBeNull();
  });

  test('the own map replaces the keys to begin with', () => {
    expect(actionOf({ on: true, keys: { q: 'flag' } }, 'q')).toBe('flag');
    expect(actionOf({ on: true, keys: { q: 'flag' } }, 'f')).toBeNull();
  });
});

describe('the key shown beside a target', () => {
  test('is the first that does it, digits before the rest, and none where keys are off or the action has no key', () => {
    expect(keyOf(null, 'code:1')).toBe('1');
    expect(keyOf({ on: false, keys: { a: 'undo' } }, 'undo')).toBeNull();
    expect(keyOf({ on: true, keys: { a: 'undo' } }, 'flag')).toBeNull();
  });
});
