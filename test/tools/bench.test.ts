import { expect, it } from 'vitest';
import { benchTable } from '../../tools/bench.ts';

it('a bench is shown against its first row of the same unit', () => {
  const lines = benchTable('kappa', [
    { label: 'plain', value: 20, unit: 'ms' },
    { label: 'typed', value: 5, unit: 'ms' },
    { label: 'memory', value: 3, unit: 'MB' },
  ]);
  expect(lines.map((line) => line.split('×')[1]?.trim())).toEqual([undefined, '1.00', '0.25', '1.00']);
});
