import { expect, it } from 'vitest';
import type { Code } from '../../src/model/codeSet.ts';
import { methods, type Protocol } from '../../src/model/protocol.ts';
import { paperNumbers } from '../../src/schedule/paperNumbers.ts';

const codes = (n: number): Protocol['codeSet'] => ({
  name: 'Some',
  codes: Array.from({ length: n }, (_, k): Code => {
    const id = `c${k + 1}`;
    return { id, label: id, role: 'other', definition: '', examples: '', nonExamples: '' };
  }),
});

const said = (method: Protocol['method'], n: number): string[] =>
  paperNumbers({ method, codeSet: codes(n) }).map(
    ({ number, means }) =>
      `${number} ${means.kind === 'code' ? means.code : means.kind === 'none' ? 'none' : means.reason}`,
  );

it('numbers codes first, then none of them; cannot see is 0, reasons come after', () => {
  expect(said('momentary', 2)).toEqual([
    '1 c1',
    '2 c2',
    '0 out of view',
    '5 left the room',
    '6 with another adult',
    '7 not taking part',
    '8 class interrupted',
    '9 other',
  ]);
  expect(said('partial', 2).slice(0, 4)).toEqual(['1 c1', '2 c2', '3 none', '0 out of view']);
  expect(said('whole', 4).slice(4)).toEqual([
    '5 none',
    '0 out of view',
    '11 left the room',
    '12 with another adult',
    '13 not taking part',
    '14 class interrupted',
    '15 other',
  ]);
  expect(said('headcount', 2)).toEqual(['0 out of view', '8 class interrupted', '9 other']);
});

it('never gives one number to two meanings, however many codes there are', () => {
  for (const method of methods)
    for (let n = 1; n <= 60; n++) {
      const numbers = paperNumbers({ method, codeSet: codes(n) }).map(({ number }) => number);
      expect(new Set(numbers).size).toBe(numbers.length);
    }
});
