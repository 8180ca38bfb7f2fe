import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { boutsFromSummary } from '../../src/stats/boutsFromSummary.ts';
import { expectNear } from './near.ts';
import { referenceTests } from './referenceCases.ts';

describe('boutsFromSummary', () => {
  referenceTests<Record<string, number>>('sampling_bias', (_input, { prevalence, incidence }) => {
    const { meanBout, meanGap } = boutsFromSummary(prevalence as number, incidence as number);
    return { inverse_mu: meanBout, inverse_lambda: meanGap };
  });

  test('gives back the bouts and gaps that prevalence and incidence came from', () => {
    const length = fc.double({ min: 0.1, max: 1000, noNaN: true });
    fc.assert(
      fc.property(length, length, (meanBout, meanGap) => {
        const got = boutsFromSummary(meanBout / (meanBout + meanGap), 1 / (meanBout + meanGap));
        expectNear(got.meanBout, meanBout, 1e-9);
        expectNear(got.meanGap, meanGap, 1e-9);
      }),
    );
  });

  test('without any bout begun it is undefined; nonsense throws', () => {
    expect(boutsFromSummary(0.5, 0)).toEqual({ meanBout: Number.NaN, meanGap: Number.NaN });
    expect(boutsFromSummary(1, 0.1)).toEqual({ meanBout: 10, meanGap: 0 });
    expect(() => boutsFromSummary(1.2, 0.1)).toThrow(/^prevalence/);
    expect(() => boutsFromSummary(0.5, -0.1)).toThrow(/^incidence/);
    expect(() => boutsFromSummary(Number.NaN, 0.1)).toThrow(RangeError);
  });
});
