import { type MissingReason, missingReasons } from '../model/missing.ts';
import type { Look, SessionRecord } from './sessionRecord.ts';

/** How many intervals are missing for one reason. */
export interface MissingFor {
  readonly reason: MissingReason;
  readonly n: number;
}

/** Missing intervals by reason, in the order of the list of reasons; reasons that did not occur are left out. */
export function missingByReason(looks: readonly Look[]): MissingFor[] {
  return missingReasons
    .map((reason) => ({ reason, n: looks.filter((look) => look.missing === reason).length }))
    .filter(({ n }) => n > 0);
}

/** How often one code was scored, and its percentage (0–100) of all scored intervals. */
export interface CodeCount {
  readonly code: string;
  readonly role: 'on-task' | 'off-task' | 'other';
  readonly n: number;
  readonly percent: number | null;
}

/** The codes of a record's set with their counts, in the order of the set. Sets of codes: percentages need not add up to 100. */
export function codeCounts({ facts }: SessionRecord, looks: readonly Look[]): CodeCount[] {
  const scored = looks.filter((look) => look.labels !== null && look.counts === null);
  return facts.codeSet.codes.map(({ label, role }) => {
    const n = scored.filter((look) => look.labels?.includes(label)).length;
    return { code: label, role, n, percent: scored.length === 0 ? null : (100 * n) / scored.length };
  });
}
