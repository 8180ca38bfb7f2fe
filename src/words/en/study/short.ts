import type { Format } from '../../format.ts';

/** A number as short as it is exact. */
export const short = (n: number, f: Format): string =>
  f.fixed(n, Number.isInteger(n) ? 0 : Number.isInteger(n * 10) ? 1 : 2);

/** What is left for the peers of a target child. */
export const peerLooks = (fewest: number, peers: number, f: Pick<Format, 'whole'>): string =>
  fewest === 0
    ? `none at some of ${f.whole(peers)} peers`
    : `at least ${f.whole(fewest)} at ${peers === 1 ? 'its peer' : `each of ${f.whole(peers)} peers`}`;

const endings: Record<string, string> = { one: 'st', two: 'nd', few: 'rd' };

/** 2nd, 3rd, 4th, 21st. */
export const ordinal = (n: number, f: Pick<Format, 'whole' | 'locale'>): string =>
  `${f.whole(n)}${endings[new Intl.PluralRules(f.locale, { type: 'ordinal' }).select(n)] ?? 'th'}`;
