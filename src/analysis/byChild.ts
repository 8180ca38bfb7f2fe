import { byCodePoint } from '../kernel/compare.ts';
import type { Look, SessionRecord } from './sessionRecord.ts';

/** The looks of one child, by the pseudonym that people see. */
export interface ChildLooks {
  readonly id: string;
  readonly child: string;
  readonly looks: readonly Look[];
}

/** A record's looks child by child, in code-point order of the pseudonyms. Headcounts have no children. */
export function byChild(record: SessionRecord): ChildLooks[] {
  const label = new Map(record.children.map((child) => [child.id, child.label]));
  const groups = new Map<string, Look[]>();
  for (const look of record.looks) {
    if (look.child === null) continue;
    const group = groups.get(look.child);
    if (group === undefined) groups.set(look.child, [look]);
    else group.push(look);
  }
  return [...groups]
    .map(([id, looks]) => ({ id, child: label.get(id) ?? id, looks }))
    .sort((a, b) => byCodePoint(a.child, b.child) || byCodePoint(a.id, b.id));
}
