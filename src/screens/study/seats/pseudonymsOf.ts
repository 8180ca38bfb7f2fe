import type { Classroom } from '../../../model/classroom.ts';

/** Child id → pseudonym, of the children who are in the class. */
export function pseudonymsOf(classroom: Classroom): Map<string, string> {
  return new Map(
    classroom.children.filter((child) => !child.removed).map((child) => [child.id, child.pseudonym]),
  );
}
