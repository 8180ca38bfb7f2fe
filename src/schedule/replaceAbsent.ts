import type { Id } from '../kernel/ids.ts';
import type { Child, Draw } from '../model/classroom.ts';

export interface Attendance {
  /** The target children of today, absent ones replaced in place. */
  readonly children: Id[];
  /** Who steps in for whom; `by` is null where no reserve was left. */
  readonly replaced: { readonly absent: Id; readonly by: Id | null }[];
}

/**
 * Puts reserves in the places of absent children, in the reserves' drawn order: the first one present of the same
 * stratum, and where that stratum has none left, the first one present of all. Without a reserve the place stays empty.
 */
export function replaceAbsent(
  draw: Draw,
  absent: ReadonlySet<Id>,
  children: readonly Pick<Child, 'id' | 'stratum'>[],
): Attendance {
  const stratumOf = new Map(children.map((child) => [child.id, child.stratum]));
  const waiting = draw.reserves.filter((reserve) => !absent.has(reserve) && stratumOf.has(reserve));
  const replaced: Attendance['replaced'] = [];
  const today = draw.chosen.flatMap((id) => {
    if (!absent.has(id) && stratumOf.has(id)) return [id];
    const sameStratum = waiting.findIndex((reserve) => stratumOf.get(reserve) === stratumOf.get(id));
    const [by] = waiting.splice(Math.max(0, sameStratum), 1);
    replaced.push({ absent: id, by: by ?? null });
    return by === undefined ? [] : [by];
  });
  return { children: today, replaced };
}
