import fc from 'fast-check';
import { expect, test } from 'vitest';
import { jsonFault } from '../../src/exchange/jsonFault.ts';

test('every true beginning of a JSON object is cut off, at its end', () => {
  fc.assert(
    fc.property(
      fc.dictionary(fc.string(), fc.jsonValue({ maxDepth: 3 })),
      fc.double({ min: 0, max: 1, noNaN: true }),
      (value, share) => {
        const text = JSON.stringify(value);
        const cut = text.slice(0, Math.floor((text.length - 1) * share));
        expect({ cut, ...jsonFault(cut) }).toMatchObject({ cutOff: true });
      },
    ),
    { numRuns: 500 },
  );
});

test.each([
  ['{"a": 1,}', 8],
  ['{"a" 1}', 5],
  ['[1 2]', 3],
  ['[01]', 1],
  ['{"a": tru3}', 6],
  ['{a: 1}', 1],
  ['["a\nb"]', 3],
  ['["\\q"]', 2],
  ['{} {}', 3],
  ["{'a': 1}", 1],
  ['[1}', 2],
])('a fault is found where it stands: %s', (text, offset) => {
  expect(() => JSON.parse(text)).toThrow();
  expect(jsonFault(text)).toEqual({ offset, cutOff: false });
});
