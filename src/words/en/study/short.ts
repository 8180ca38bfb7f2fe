import type { Format } from '../../format.ts';

/** A number as short as it is exact. */
export const short = (n: number, f: Format): string =>
  f.fixed(n, Number.isInteger(n) ? 0 : Number.isInteger(n * 10) ? 1 : 2);
