import { requireThat } from './requireThat.ts';

/** Scores of one phase or series in the order of time; `null` where a session gave none: it keeps its place in time. */
export type PhaseScores = ArrayLike<number | null | undefined>;

/** The scores that are there, in order. Throws for anything that is neither a finite number nor missing. */
export function present(scores: PhaseScores, argument: string): number[] {
  const kept: number[] = [];
  for (let i = 0; i < scores.length; i++) {
    const score = scores[i];
    if (score === null || score === undefined) continue;
    requireThat(Number.isFinite(score), argument, 'must hold finite numbers or null');
    kept.push(score);
  }
  return kept;
}

/** Pairs (one of a, one of b) in which b is higher less those in which it is lower. */
export function dominance(a: readonly number[], b: readonly number[]): number {
  let sum = 0;
  for (const y of b) for (const x of a) sum += Math.sign(y - x);
  return sum;
}
