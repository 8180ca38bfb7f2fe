import type { Code } from '../../../model/codeSet.ts';
import { codeSigns, type EdgeTarget } from '../codeEdges.ts';

/** Where the targets lie when nobody looks: halves or corners that never change, and one place low in the middle. */
export interface Zones {
  readonly kind: 'halves' | 'corners';
  /** In reading order: left, right; or top left, top right, bottom left, bottom right. */
  readonly zones: readonly EdgeTarget[];
  /** What lies low in the middle, where no zone is left for it. */
  readonly middle: EdgeTarget | null;
}

/**
 * Two targets have halves, three and four have corners; *cannot see* takes the fourth corner where it is free. null
 * where there are more: they could not be told apart without looking.
 * @param withNone "none of these" is an answer
 */
export function eyesUpZones(codes: readonly Code[], withNone: boolean): Zones | null {
  const signs = codeSigns(codes);
  const targets: EdgeTarget[] = codes.map((code, i) => ({
    kind: 'code',
    code,
    sign: signs.get(code.id) ?? 'other',
    position: i + 1,
  }));
  if (withNone) targets.push({ kind: 'nothing' });
  const cannotSee: EdgeTarget = { kind: 'cannot see' };
  if (targets.length < 2 || targets.length > 4) return null;
  if (targets.length === 2) return { kind: 'halves', zones: targets, middle: cannotSee };
  if (targets.length === 3) return { kind: 'corners', zones: [...targets, cannotSee], middle: null };
  return { kind: 'corners', zones: targets, middle: cannotSee };
}
