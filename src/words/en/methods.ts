import type { Format } from '../format.ts';

type F = Format;

/** Methods and checks: each measure, its source, and its check recomputed here. */
export const methods = {
  title: ({ equal, of }: { equal: number; of: number }, f: F) =>
    equal === of
      ? `All ${f.whole(of)} measures give their expected values on this device.`
      : `${f.whole(equal)} of ${f.whole(of)} measures give their expected values on this device.`,
  workingTitle: ({ done, of }: { done: number; of: number }, f: F) =>
    `Recomputing the checks: ${f.whole(done)} of ${f.whole(of)}.`,
  note: 'Each measure is worked out here and now for an example whose result is known from elsewhere: printed in its source, from another program, or worked by hand.',
  loading: 'Opening the measures …',
  equal: 'equal within the tolerance',
  differs: 'not equal',
  waiting: 'not worked out yet',
  equalCount: 'equal',
  differsCount: 'not equal',
  measuresCount: 'measures',
  formula: 'Formula',
  source: 'Source',
  check: 'Check',
  expected: 'Expected',
  got: 'Worked out here',
  tolerance: ({ value }: { value: number }) => `tolerance ${value}`.replace('-', '−'),
  value: ({ value }: { value: number }) =>
    Number.isNaN(value) ? 'not defined' : String(Number(value.toPrecision(10))).replace('-', '−'),
  again: 'Work them out again',
} as const;
