import { readFileSync } from 'node:fs';
import { expect, test } from 'vitest';

interface Tolerance {
  readonly relative: number;
  readonly absolute: number;
}

interface Case {
  readonly id: string;
  readonly source: string;
  readonly input: Record<string, unknown>;
  readonly expected: Record<string, unknown>;
  readonly tolerance: Tolerance | Record<string, Tolerance>;
}

/** The outside values of one family of measures, each with its source and tolerance. */
export function casesOf(family: string): Case[] {
  const text = readFileSync(new URL(`../reference/${family}.json`, import.meta.url), 'utf8');
  return (JSON.parse(text) as { cases: Case[] }).cases;
}

/** Null in the reference is NaN here; a string is an infinite number. */
export function agrees(got: number, want: unknown, { relative, absolute }: Tolerance): boolean {
  if (want === null) return Number.isNaN(got);
  const wanted = Number(want);
  if (!Number.isFinite(wanted)) return got === wanted;
  return Math.abs(got - wanted) <= Math.max(absolute, relative * Math.abs(wanted));
}

function valueAt(expected: unknown, path: string): unknown {
  return path.split('.').reduce<unknown>((value, key) => (value as Record<string, unknown>)[key], expected);
}

interface Options {
  /** Which cases of the family; all when left out. */
  readonly only?: (input: Record<string, unknown>, expected: Record<string, unknown>) => boolean;
  /** Tolerance for one value, where the file gives several. */
  readonly tolerance?: (path: string, given: Record<string, Tolerance>) => Tolerance;
}

/**
 * One test for each reference case: `compute` returns the figures under the paths they have in the file
 * (`per_code.0.kappa`), and every one of them must be there and agree.
 */
export function referenceTests<Input>(
  family: string,
  compute: (input: Input, expected: Record<string, unknown>) => Record<string, number>,
  { only = () => true, tolerance }: Options = {},
): void {
  const cases = casesOf(family).filter(({ input, expected }) => only(input, expected));
  test(`${family}: there are reference cases`, () => {
    expect(cases.length).toBeGreaterThan(0);
  });
  for (const { id, source, input, expected, tolerance: given } of cases) {
    test(`${id}: ${source}`, () => {
      const figures = compute(input as Input, expected);
      expect(Object.keys(figures).length).toBeGreaterThan(0);
      for (const [path, got] of Object.entries(figures)) {
        const want = valueAt(expected, path);
        expect(want, `${path} is in the file`).toBeDefined();
        const allowed = tolerance
          ? tolerance(path, given as Record<string, Tolerance>)
          : (given as Tolerance);
        expect(agrees(got, want, allowed), `${path}: got ${got}, want ${String(want)}`).toBe(true);
      }
    });
  }
}
