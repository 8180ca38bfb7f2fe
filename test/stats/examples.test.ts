import { readdirSync, readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import * as stats from '../../src/stats/index.ts';
import { normalQuantile } from '../../src/stats/normalQuantile.ts';

const folder = new URL('../../src/stats/', import.meta.url);
const known: Record<string, unknown> = { ...stats, normalQuantile };

interface Example {
  readonly file: string;
  readonly call: string;
  readonly printed: string;
}

const examples = readdirSync(folder).flatMap((file): Example[] => {
  const text = readFileSync(new URL(file, folder), 'utf8');
  return [...text.matchAll(/@example (.+?) \/\/ → (.+)$/gm)].map(([, call, printed]) => ({
    file,
    call: call as string,
    printed: printed as string,
  }));
});

function evaluate(expression: string): unknown {
  return new Function(...Object.keys(known), `return ${expression};`)(...Object.values(known));
}

describe('the examples in the docstrings', () => {
  test('every measure has one', () => {
    for (const { name } of stats.measures) {
      expect(
        examples.some(({ file }) => file === `${name}.ts`),
        name,
      ).toBe(true);
    }
  });

  test.each(examples.map(({ file, call, printed }) => [file, call, printed]))(
    '%s: %s gives %s',
    (_file, call, printed) => {
      const got = evaluate(call as string);
      const want = evaluate(printed as string);
      if (typeof want !== 'number') expect(got).toEqual(want);
      else {
        // As many places as are printed.
        const places = (printed as string).split('.')[1]?.length ?? 0;
        expect(Math.abs((got as number) - want)).toBeLessThanOrEqual(0.5000001 * 10 ** -places);
      }
    },
  );
});
