import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { confusionTable } from '../../src/stats/confusionTable.ts';

describe('confusionTable', () => {
  test('rows are the first observer, columns the second, in the order of the codes', () => {
    expect(confusionTable(['on', 'on', 'off', 'on'], ['off', 'on', 'off', 'off'], ['off', 'on'])).toEqual([
      [1, 0],
      [2, 1],
    ]);
  });

  test('pairs with a missing side are left out: null, undefined, and −1 where it is no code', () => {
    expect(confusionTable([1, null, 2, undefined], [1, 1, null, 2], [1, 2])).toEqual([
      [1, 0],
      [0, 0],
    ]);
    expect(confusionTable(Int8Array.of(0, -1, 1), Int8Array.of(0, 1, 1), [0, 1])).toEqual([
      [1, 0],
      [0, 1],
    ]);
    expect(confusionTable([-1, 0], [-1, -1], [-1, 0])).toEqual([
      [1, 0],
      [1, 0],
    ]);
  });

  test('typed and plain arrays give the same table, and the transpose when observers change places', () => {
    const code = fc.integer({ min: -1, max: 3 });
    fc.assert(
      fc.property(fc.array(fc.tuple(code, code)), (pairs) => {
        const a = pairs.map(([x]) => x);
        const b = pairs.map(([, y]) => y);
        const table = confusionTable(a, b, [0, 1, 2, 3]);
        expect(confusionTable(Int8Array.from(a), Int16Array.from(b), [0, 1, 2, 3])).toEqual(table);
        const turned = confusionTable(b, a, [0, 1, 2, 3]);
        expect(turned).toEqual(table.map((_, i) => table.map((row) => row[i])));
        expect(table.flat().reduce((x, y) => x + y, 0)).toBe(
          pairs.filter(([x, y]) => x >= 0 && y >= 0).length,
        );
      }),
    );
  });

  test('a number and its text are different codes', () => {
    expect(confusionTable(['1', 1], ['1', 1], [1, '1'])).toEqual([
      [1, 0],
      [0, 1],
    ]);
  });

  test('nonsense throws and names the argument', () => {
    expect(() => confusionTable([1], [1, 1], [1])).toThrow(/^a, b/);
    expect(() => confusionTable([3], [1], [1, 2])).toThrow(/^a: holds 3/);
    expect(() => confusionTable([1], ['x'], [1, 2])).toThrow(/^b: holds x/);
    expect(() => confusionTable([1], [1], [1, 1])).toThrow(/^codes/);
    expect(() => confusionTable([1], [1], [1, 1])).toThrow(RangeError);
  });
});
