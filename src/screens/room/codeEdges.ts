import type { Code } from '../../model/codeSet.ts';

/** What a code looks like: on-task filled, kinds of off-task hatched, denser down the list, anything else an outline. */
export type SignKind = number | 'other';

export type EdgeTarget =
  | { readonly kind: 'code'; readonly code: Code; readonly sign: SignKind; readonly position: number }
  | { readonly kind: 'nothing' }
  | { readonly kind: 'cannot see' };

export interface Edges {
  readonly left: readonly EdgeTarget[];
  readonly right: readonly EdgeTarget[];
}

/** The sign of each code of a set, by the code's id. */
export function codeSigns(codes: readonly Code[]): ReadonlyMap<string, SignKind> {
  let off = 0;
  return new Map(
    codes.map((code): [string, SignKind] => {
      if (code.role === 'on-task') return [code.id, 0];
      if (code.role === 'other') return [code.id, 'other'];
      off += 1;
      return [code.id, off];
    }),
  );
}

/**
 * Which targets stand at which edge, always in the same places: on-task on the left, the others on the right with
 * *cannot see* as their last; from four codes on, the left edge takes its share.
 *
 * @param latched several codes may be marked in one interval, so that "none of these" is an answer
 */
export function codeEdges(codes: readonly Code[], latched: boolean): Edges {
  const signs = codeSigns(codes);
  const targets = codes.map(
    (code, i): EdgeTarget => ({ kind: 'code', code, sign: signs.get(code.id) ?? 'other', position: i + 1 }),
  );
  const isOn = (target: EdgeTarget): boolean => target.kind === 'code' && target.code.role === 'on-task';
  const left = targets.filter(isOn);
  const right = targets.filter((target) => !isOn(target));
  const nothing: EdgeTarget[] = latched ? [{ kind: 'nothing' }] : [];
  const half = Math.floor((targets.length + nothing.length + 1) / 2);
  // With two or three codes on-task keeps the left edge for itself, felt without looking.
  const leftWants = targets.length < 4 ? Math.max(1, left.length) : half - nothing.length;
  while (left.length < leftWants && right.length > 0) left.push(right.shift() as EdgeTarget);
  return { left: [...left, ...nothing], right: [...right, { kind: 'cannot see' }] };
}
