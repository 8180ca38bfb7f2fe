/**
 * The invented school of the demo, as it really is: what an endless observation would find. Tests ask whether the
 * analysis recovers it. All of it is made up; levels lie where published class means lie (Goh et al. 2016; Howie,
 * Beets & Pate 2014), and no child stands for a real one.
 */

export interface ClassTruth {
  readonly name: string;
  readonly animal: string;
  readonly condition: 'break' | 'usual';
  /** Share of time on-task before, mean of the class's children. */
  readonly before: number;
  /** What the second phase adds to every child's share. */
  readonly change: number;
}

export const classes: readonly ClassTruth[] = [
  { name: 'Otter', animal: 'Otter', condition: 'break', before: 0.74, change: 0.12 },
  { name: 'Heron', animal: 'Heron', condition: 'break', before: 0.78, change: 0.1 },
  { name: 'Lark', animal: 'Lark', condition: 'usual', before: 0.77, change: -0.04 },
  { name: 'Newt', animal: 'Newt', condition: 'usual', before: 0.75, change: -0.02 },
];

/** How far the children of a class lie apart, from the least to the most on-task (half the range, share of time). */
export const childSpread = 0.12;

/** Mean length of an off-task bout in seconds; on-task bouts follow from the share. */
export const meanOffBout = 12;

/** Of off-task moments, the share that is with others. */
export const withOthers = 0.6;

/** Chance that an observer marks the other thing, by how many visits she has behind her. Marsh drifts. */
export function errorOf(observer: 'Quill' | 'Marsh', visitsSoFar: number): number {
  return observer === 'Quill' ? 0.02 : Math.min(0.3, 0.02 + 0.09 * visitsSoFar);
}

/** A child's true share of time on-task in a phase. `place` is −1 … 1 within the class. */
export function shareOf(truth: ClassTruth, place: number, phase: 'before' | 'after'): number {
  return truth.before + childSpread * place + (phase === 'after' ? truth.change : 0);
}

/** Mean bout and gap in seconds that give this share. */
export function boutsOf(share: number): { meanBout: number; meanGap: number } {
  return { meanBout: (meanOffBout * share) / (1 - share), meanGap: meanOffBout };
}
