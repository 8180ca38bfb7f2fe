import fc from 'fast-check';

export interface Phases {
  A: (number | null)[];
  B: (number | null)[];
  improvement: 'increase' | 'decrease';
}

/** Where less is better, the measures are given both phases with their signs turned. */
export function improving({ A, B, improvement }: Phases): [(number | null)[], (number | null)[]] {
  if (improvement === 'increase') return [A, B];
  const turn = (scores: (number | null)[]): (number | null)[] =>
    scores.map((score) => (score === null ? null : -score));
  return [turn(A), turn(B)];
}

export const phase = fc.array(fc.option(fc.integer({ min: 0, max: 20 }), { nil: null, freq: 8 }), {
  maxLength: 12,
});

export const present = (scores: (number | null)[]): number[] => scores.filter((score) => score !== null);

/** The worked pair of phases used by hand throughout: means 66 and 75.6. */
export const handA = [62, 70, 66, 64, 68];
export const handB = [74, 78, 70, 80, 76];
