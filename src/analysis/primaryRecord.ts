import type { Remark } from './remark.ts';
import type { SessionRecord } from './sessionRecord.ts';
import type { Visit } from './visits.ts';

/** Which record of a visit counts, or what keeps it from being known. */
export interface Choice {
  readonly record: SessionRecord | null;
  readonly problem: Remark | null;
  readonly notice: Remark | null;
}

/**
 * The one record of a visit that counts towards change: the chosen observer's where that observer was there; else the
 * primary's, or the only one that is not marked as second; a single observer without a role counts. Two observers
 * without roles are a problem: the order of files must not decide. A second observer alone checked a record that is
 * not here, and is left out with a notice.
 */
export function primaryRecord(visit: Visit, observer: string | null = null): Choice {
  const { records } = visit;
  const about = (code: Remark['code'], which: readonly SessionRecord[]): Remark => ({
    code,
    values: {
      visit: visit.visit ?? which[0]?.label ?? '',
      class: visit.className ?? '',
      phase: visit.phase ?? '',
      observers: which.map((record) => record.observer).join(', '),
    },
    sessions: which.map((record) => record.session),
  });
  const chosen = observer === null ? undefined : records.find((record) => record.observer === observer);
  if (chosen !== undefined) return { record: chosen, problem: null, notice: null };
  const primaries = records.filter(({ role }) => role === 'primary');
  if (primaries.length > 1) {
    return { record: null, problem: about('visitWithTwoPrimaries', primaries), notice: null };
  }
  const candidates = primaries.length === 1 ? primaries : records.filter(({ role }) => role !== 'second');
  if (candidates.length > 1) {
    return { record: null, problem: about('visitWithoutRole', candidates), notice: null };
  }
  const record = candidates[0] ?? null;
  return { record, problem: null, notice: record === null ? about('secondAlone', records) : null };
}
