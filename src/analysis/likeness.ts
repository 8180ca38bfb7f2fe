/** What one observer has at one place of the schedule: one text where codes are recorded, a share 0–1 where heads are counted. */
export type Said = string | number | null;

/**
 * How much better two entries, of place `i` in the first record and `j` in the second, are explained as two looks at one
 * and the same moment than as two that have nothing to do with each other: a logarithm of likelihoods, 0 where either
 * is missing.
 */
export type Likeness = (i: number, j: number) => number;

/**
 * How well the two observers agree otherwise, 0–1: kappa for codes, the correlation for shares. All of these are tried;
 * the one that explains the records best counts.
 */
export const closenesses: readonly number[] = [0.2, 0.4, 0.6, 0.75, 0.87, 0.95];

/** A code rarer than this counts as this rare: one rare code in the same place twice must not decide by itself. */
const rarest = 0.05;
/** Shares farther than this many standard deviations from the mean count as so far. */
const farthest = 3;

/** How two records can be compared, place by place. */
export interface Comparing {
  /** For each closeness. */
  readonly likenesses: readonly Likeness[];
  /** How much neighbouring entries of one record agree beyond chance, 0–1: 0 where each look is a new child. */
  readonly lasting: number;
}

/** How entries of two records are compared. Records of codes or of shares, never both. */
export function comparing(a: readonly Said[], b: readonly Said[]): Comparing {
  return [a, b].some((record) => record.some((one) => typeof one === 'number'))
    ? ofShares(a.map(numberOf), b.map(numberOf))
    : ofCodes(a, b);
}

const numberOf = (said: Said): number => (typeof said === 'number' ? said : Number.NaN);

/**
 * Codes: with probability kappa the second observer says what the first said, else any code as often as it occurs.
 *
 * Where behaviour lasts longer than from one look to the next (one child, a whole class), a code that stands alone
 * between two others is more likely a slip than something to be seen, and says little of which look it belongs to: its
 * kappa is less by as much as neighbouring entries of one record agree. Without that, two slips at different looks would
 * pass for a shift.
 */
function ofCodes(a: readonly Said[], b: readonly Said[]): Comparing {
  const names = [...new Set([...a, ...b])].filter((one) => one !== null);
  const [first, second] = [a, b].map((record) => record.map((one) => names.indexOf(one as string))) as [
    number[],
    number[],
  ];
  const said = [...first, ...second].filter((one) => one >= 0);
  const shares = names.map((_, code) => said.filter((one) => one === code).length / said.length);
  const lasting = lastingOf([first, second], shares);
  const [aloneA, aloneB] = [standsAlone(first), standsAlone(second)];
  const likenesses = closenesses.map((kappa): Likeness => {
    const kappaAlone = Math.max(0, kappa - lasting);
    const same = shares.map((share) => matchOf(kappa, share));
    const sameAlone = shares.map((share) => matchOf(kappaAlone, share));
    const [other, otherAlone] = [Math.log(1 - kappa), Math.log(1 - kappaAlone)];
    return (i, j) => {
      const [x = -1, y = -1] = [first[i], second[j]];
      if (x < 0 || y < 0) return 0;
      const alone = aloneA[i] === true || aloneB[j] === true;
      if (x !== y) return alone ? otherAlone : other;
      return (alone ? sameAlone : same)[x] ?? 0;
    };
  });
  return { likenesses, lasting };
}

const matchOf = (kappa: number, share: number): number =>
  Math.log(1 - kappa + kappa / Math.max(rarest, share));

/** How much oftener than by chance neighbouring entries of one record are the same, 0–1. */
function lastingOf(records: readonly (readonly number[])[], shares: readonly number[]): number {
  let [pairs, same] = [0, 0];
  for (const record of records) {
    for (const [i, x] of record.entries()) {
      const next = record[i + 1] ?? -1;
      if (x < 0 || next < 0) continue;
      pairs += 1;
      if (x === next) same += 1;
    }
  }
  const chance = shares.reduce((sum, share) => sum + share * share, 0);
  return pairs === 0 || chance >= 1 ? 0 : Math.max(0, (same / pairs - chance) / (1 - chance));
}

function standsAlone(record: readonly number[]): boolean[] {
  return record.map((x, i) => record[i - 1] !== x && record[i + 1] !== x);
}

/** Shares: two normal numbers with that correlation. */
function ofShares(a: readonly number[], b: readonly number[]): Comparing {
  const said = [...a, ...b].filter((x) => !Number.isNaN(x));
  const mean = said.reduce((sum, x) => sum + x, 0) / said.length;
  const sd = Math.sqrt(said.reduce((sum, x) => sum + (x - mean) ** 2, 0) / said.length);
  const score = (x: number): number =>
    sd === 0 ? 0 : Math.max(-farthest, Math.min(farthest, (x - mean) / sd));
  const [first, second] = [a.map(score), b.map(score)];
  const likenesses = closenesses.map(
    (r): Likeness =>
      (i, j) => {
        const [x = Number.NaN, y = Number.NaN] = [first[i], second[j]];
        if (Number.isNaN(x) || Number.isNaN(y)) return 0;
        return -Math.log(1 - r * r) / 2 - (r * r * (x * x + y * y) - 2 * r * x * y) / (2 * (1 - r * r));
      },
  );
  return { likenesses, lasting: neighbourCorrelation([first, second]) };
}

/** The correlation of neighbouring scores of one record, no less than 0. */
function neighbourCorrelation(records: readonly (readonly number[])[]): number {
  let [products, squares] = [0, 0];
  for (const record of records) {
    for (const [i, x] of record.entries()) {
      const next = record[i + 1] ?? Number.NaN;
      if (Number.isNaN(x) || Number.isNaN(next)) continue;
      products += x * next;
      squares += (x * x + next * next) / 2;
    }
  }
  return squares === 0 ? 0 : Math.max(0, products / squares);
}
