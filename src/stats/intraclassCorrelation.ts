import type { About } from './about.ts';
import { fQuantile } from './distributions.ts';
import { mean } from './moments.ts';
import { requireConfidence, requireFinite, requireThat } from './requireThat.ts';

export type IccForm = '1,1' | '2,1' | '3,1' | '1,k' | '2,k' | '3,k';

export interface IntraclassCorrelation {
  readonly icc: number;
  readonly lower: number;
  readonly upper: number;
  readonly f: number;
  readonly df1: number;
  readonly df2: number;
}

/** Mean squares of targets × observers: between targets, within targets, between observers, error. */
interface MeanSquares {
  readonly n: number;
  readonly k: number;
  readonly between: number;
  readonly within: number;
  readonly observers: number;
  readonly error: number;
}

/**
 * How much of the spread of scores is spread between targets (children, sessions): rows = targets, columns =
 * observers, complete. Forms of Shrout & Fleiss: 1 = other observers for each target, 2 = the same observers, a
 * sample of many (absolute agreement), 3 = the same and only these (consistency); 1 = of one observer, k = of their
 * average. Two-sided interval; bounds are not clipped. F tests icc = 0.
 *
 * Undefined (NaN): all scores equal, fewer than two targets or observers. No spread between targets: −1/(k − 1) for
 * (1,1) and (3,1), averages undefined. No error: F and bounds. A sum of squares under 1e-12 of the total counts as 0.
 * Relative error 1e-8.
 *
 * Source: Shrout & Fleiss 1979, Psychol Bull 86:420-428.
 *
 * @example intraclassCorrelation([[9, 2, 5, 8], [6, 1, 3, 2], [8, 4, 6, 8], [7, 1, 2, 6], [10, 5, 6, 9], [6, 2, 4, 7]], '2,1').icc // → 0.29
 */
export function intraclassCorrelation(
  scores: readonly (readonly number[])[],
  form: IccForm,
  confidence = 0.95,
): IntraclassCorrelation {
  requireConfidence(confidence);
  requireThat(
    ['1,1', '2,1', '3,1', '1,k', '2,k', '3,k'].includes(form),
    'form',
    'must be one of the six forms',
  );
  const squares = meanSquares(scores);
  const { n, k, between, within, observers, error } = squares;
  const [model, unit] = form.split(',') as ['1' | '2' | '3', '1' | 'k'];
  const noise = model === '1' ? within : error;
  const df1 = n - 1;
  const df2 = model === '1' ? n * (k - 1) : (n - 1) * (k - 1);
  const f = noise > 0 ? between / noise : Number.NaN;
  // What the observers' own differences add to the noise, as they do in form 2 only.
  const shift = model === '2' ? (k * (observers - error)) / n : 0;
  const signal = between - noise;
  const whole = unit === 'k' ? between + shift / k : between + (k - 1) * noise + shift;
  const icc = whole === 0 || n < 2 || k < 2 ? Number.NaN : signal / whole;
  const single =
    model === '2' ? absoluteBounds(squares, confidence) : consistentBounds(f, k, df1, df2, confidence);
  const isDefined = !Number.isNaN(icc) && !Number.isNaN(f);
  const [lower, upper] = single.map((bound) => {
    if (!isDefined) return Number.NaN;
    const stepped = unit === 'k' ? (k * bound) / (1 + (k - 1) * bound) : bound;
    return Number.isFinite(stepped) ? stepped : Number.NaN;
  }) as [number, number];
  return { icc, lower, upper, f, df1, df2 };
}

function meanSquares(scores: readonly (readonly number[])[]): MeanSquares {
  const n = scores.length;
  const k = scores[0]?.length ?? 0;
  for (const row of scores) {
    requireThat(row.length === k, 'scores', 'must have a score of every observer for every target');
    requireFinite(row, 'scores');
  }
  const rowMeans = scores.map((row) => mean(row));
  const columnMeans = Array.from({ length: k }, (_, j) => mean(scores.map((row) => row[j] as number)));
  const grand = mean(rowMeans);
  const betweenSum = k * rowMeans.reduce((sum, m) => sum + (m - grand) ** 2, 0);
  const observersSum = n * columnMeans.reduce((sum, m) => sum + (m - grand) ** 2, 0);
  let withinSum = 0;
  let errorSum = 0;
  let largest = 0;
  scores.forEach((row, i) => {
    row.forEach((score, j) => {
      withinSum += (score - (rowMeans[i] as number)) ** 2;
      errorSum += (score - (rowMeans[i] as number) - (columnMeans[j] as number) + grand) ** 2;
      largest = Math.max(largest, Math.abs(score));
    });
  });
  const total = betweenSum + withinSum;
  const isNoise = total <= n * k * (1e-12 * largest) ** 2;
  const clean = (sum: number): number => (isNoise || sum < 1e-12 * total ? 0 : sum);
  return {
    n,
    k,
    between: clean(betweenSum) / (n - 1),
    within: clean(withinSum) / (n * (k - 1)),
    observers: clean(observersSum) / (k - 1),
    error: clean(errorSum) / ((n - 1) * (k - 1)),
  };
}

function consistentBounds(
  f: number,
  k: number,
  df1: number,
  df2: number,
  confidence: number,
): [number, number] {
  if (!(df1 > 0) || !(df2 > 0)) return [Number.NaN, Number.NaN];
  const p = (1 + confidence) / 2;
  const low = f / fQuantile(p, df1, df2);
  const high = f * fQuantile(p, df2, df1);
  return [(low - 1) / (low + k - 1), (high - 1) / (high + k - 1)];
}

/** Bounds of ICC(2,1), with Satterthwaite's degrees of freedom as in the 1979 paper. */
function absoluteBounds(
  { n, k, between, observers, error }: MeanSquares,
  confidence: number,
): [number, number] {
  if (!(error > 0) || !(between > 0) || n < 2 || k < 2) return [Number.NaN, Number.NaN];
  const rho = (between - error) / (between + (k - 1) * error + (k * (observers - error)) / n);
  const ratio = observers / error;
  const rest = n * (1 + (k - 1) * rho) - k * rho;
  const nu =
    ((k - 1) * (n - 1) * (k * rho * ratio + rest) ** 2) / ((n - 1) * (k * rho * ratio) ** 2 + rest ** 2);
  if (!(nu > 0)) return [Number.NaN, Number.NaN];
  const p = (1 + confidence) / 2;
  const down = fQuantile(p, n - 1, nu);
  const up = fQuantile(p, nu, n - 1);
  const common = k * observers + (k * n - k - n) * error;
  return [
    (n * (between - down * error)) / (down * common + n * between),
    (n * (up * between - error)) / (common + n * up * between),
  ];
}

export const about: About = {
  name: 'intraclassCorrelation',
  sentence: 'How much of the differences between scores are real differences between children or sessions.',
  formula: 'ICC(2,1) = (MS_B − MS_E) / (MS_B + (k − 1)MS_E + k(MS_J − MS_E)/n), and five sister forms',
  source: 'Shrout & Fleiss 1979, Psychol Bull 86:420-428',
  check: {
    input: "intraclassCorrelation of six targets by four observers, '2,1'",
    expected: 0.29,
    source: 'Shrout & Fleiss 1979, Tables 2 and 4',
    tolerance: 5e-3,
  },
  recompute: () =>
    intraclassCorrelation(
      [
        [9, 2, 5, 8],
        [6, 1, 3, 2],
        [8, 4, 6, 8],
        [7, 1, 2, 6],
        [10, 5, 6, 9],
        [6, 2, 4, 7],
      ],
      '2,1',
    ).icc,
};
