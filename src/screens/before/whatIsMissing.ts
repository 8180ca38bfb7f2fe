import type { Classroom } from '../../model/classroom.ts';
import type { Protocol } from '../../model/protocol.ts';
import { looksAtEverybody, watchesOne } from '../../schedule/orderOfDay.ts';

export type Missing = 'class' | 'protocol' | 'phases' | 'children' | 'draw' | 'child';

interface Choices {
  readonly classroom: Classroom | null;
  readonly protocol: Protocol | null;
  readonly phases: readonly string[];
  /** The child that was chosen to be the target, or the only one. */
  readonly first: string | null;
}

/** The first thing that a visit cannot be prepared without; null when all is there. */
export function whatIsMissing({ classroom, protocol, phases, first }: Choices): Missing | null {
  if (classroom === null) return 'class';
  if (protocol === null) return 'protocol';
  if (phases.length === 0) return 'phases';
  if (classroom.children.every((child) => child.removed)) return 'children';
  if (looksAtEverybody(protocol) || classroom.draw !== null) return null;
  if (!watchesOne(protocol)) return 'draw';
  return first === null ? 'child' : null;
}

/** The part of the page on which it is mended. */
export const placeOf = (missing: Missing | null): 'class' | 'protocol' | 'phases' | 'day' =>
  missing === 'class' || missing === 'protocol' || missing === 'phases' ? missing : 'day';
