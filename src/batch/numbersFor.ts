import type { Words } from '../words/words.ts';

type Written = (n: number | null) => string;

/** How numbers are written in tables; an undefined one as a dash. */
export function numbersFor({ f, batch }: Words): {
  readonly whole: Written;
  readonly decimal: Written;
  readonly two: Written;
  readonly points: Written;
  readonly kappa: Written;
  readonly p: Written;
  readonly range: (lower: number | null, upper: number | null, written: Written) => string;
} {
  const or =
    (write: (n: number) => string): Written =>
    (n) =>
      n === null ? batch.undefinedMark : write(n);
  return {
    whole: or(f.whole),
    decimal: or(f.decimal),
    two: or((n) => f.fixed(n, 2)),
    points: or(f.points),
    kappa: or(f.kappa),
    p: or(f.p),
    range: (lower, upper, written) =>
      lower === null && upper === null ? batch.undefinedMark : `${written(lower)}–${written(upper)}`,
  };
}
