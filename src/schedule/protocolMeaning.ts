import type { Protocol } from '../model/protocol.ts';
import { intervalsInPart } from './layOut.ts';

type Recipe = Pick<
  Protocol,
  'method' | 'intervalMs' | 'observeMs' | 'rotation' | 'partLength' | 'childrenToDraw'
>;

export type ProtocolWarning = 'longInterval' | 'longObserve' | 'fewLooks';

export interface ProtocolMeaning {
  /** Intervals of one part, all children together. */
  readonly intervals: number;
  /** Milliseconds from the beginning of a part to the end of its last interval. */
  readonly lengthMs: number;
  /** Children who are watched in one part. */
  readonly watched: number;
  /** Looks in one part at the child who gets fewest and at the one who gets most. */
  readonly fewest: number;
  readonly most: number;
  /** What makes figures weak; it is said and never stops anybody. */
  readonly warnings: readonly ProtocolWarning[];
}

/**
 * What a protocol comes to in one part with all children present.
 * Warnings: a momentary interval over 30 s, more than 10 s watched in partial or whole intervals, fewer than 10
 * looks at a child (limits as the field uses them: common practice, no single source).
 */
export function protocolMeaning(recipe: Recipe): ProtocolMeaning {
  const { rotation, method } = recipe;
  const intervals = intervalsInPart(recipe.partLength, recipe, recipe.childrenToDraw);
  const watched = rotation.kind === 'one' ? 1 : recipe.childrenToDraw;
  const inRow = rotation.kind === 'block' ? rotation.intervals : 1;
  const rounds = Math.floor(intervals / (inRow * watched));
  const rest = intervals - rounds * inRow * watched;
  const fewest = rounds * inRow + Math.max(0, rest - (watched - 1) * inRow);
  const most = rounds * inRow + Math.min(rest, inRow);
  const warnings: ProtocolWarning[] = [];
  if (method === 'momentary' && recipe.intervalMs > 30_000) warnings.push('longInterval');
  if ((method === 'partial' || method === 'whole') && recipe.observeMs > 10_000) warnings.push('longObserve');
  if (fewest < 10) warnings.push('fewLooks');
  return { intervals, lengthMs: intervals * recipe.intervalMs, watched, fewest, most, warnings };
}
