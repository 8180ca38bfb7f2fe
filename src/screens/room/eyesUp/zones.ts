import type { Code } from '../../../model/codeSet.ts';
import { codeEdges, type EdgeTarget } from '../codeEdges.ts';

/** Where the targets lie when nobody looks: places that never change. For the left hand the sides change over. */
export interface Zones {
  readonly kind: 'halves' | 'corners';
  /** Top to bottom: one a side in halves, two in corners. */
  readonly left: readonly EdgeTarget[];
  readonly right: readonly EdgeTarget[];
  /** What lies across the whole foot of the glass, where the number of targets is odd. */
  readonly foot: EdgeTarget | null;
}

/** Four corners and the foot: more places are not told apart without looking. */
const mostPlaces = 5;

/**
 * Two halves or four corners. Codes keep the sides that they have in the ordinary layout; *cannot see* is a place as
 * good as theirs: a corner, or the whole foot. null where there are more targets than places.
 *
 * @param withNone "none of these" is an answer
 */
export function eyesUpZones(codes: readonly Code[], withNone: boolean): Zones | null {
  const targets = codes.length + (withNone ? 2 : 1);
  if (targets > mostPlaces) return null;
  const edges = codeEdges(codes, withNone);
  const left = edges.left.filter(isCode);
  const right = edges.right.filter(isCode);
  const aSide = Math.floor(targets / 2);
  while (left.length > aSide) right.unshift(left.pop() as EdgeTarget);
  while (right.length > aSide) left.push(right.shift() as EdgeTarget);
  const fill = (target: EdgeTarget): void => {
    (left.length < aSide ? left : right).push(target);
  };
  if (withNone) fill({ kind: 'nothing' });
  const odd = targets % 2 === 1;
  if (!odd) fill({ kind: 'cannot see' });
  return { kind: aSide === 1 ? 'halves' : 'corners', left, right, foot: odd ? { kind: 'cannot see' } : null };
}

const isCode = (target: EdgeTarget): boolean => target.kind === 'code';
