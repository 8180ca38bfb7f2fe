import type { StoredSession } from '../journal/stored.ts';
import { effectiveLooks, lagOneAutocorrelation } from '../stats/index.ts';
import { byChild } from './byChild.ts';
import { type CodeCount, codeCounts, type MissingFor, missingByReason } from './makeUp.ts';
import { type OnTaskSession, onTaskSession } from './onTaskReport.ts';
import { byText } from './order.ts';
import { type Look, type SessionRecord, sessionRecords } from './sessionRecord.ts';
import { type Share, shareOf, tallyOf } from './tally.ts';
import { type TimingFacts, timingFacts } from './timingFacts.ts';
import { limits, methodWarnings, shareWarnings, type Warning, warning } from './warning.ts';
import { settle, type Why } from './why.ts';

/** One child in one phase of one session. */
export interface ChildDetails extends Omit<Share, 'why'> {
  readonly id: string;
  readonly child: string;
  readonly missingBy: readonly MissingFor[];
  /** How much one look tells about the next, −1 to 1. */
  readonly autocorrelation: number | null;
  /** How many independent looks these are worth; never more than there are. */
  readonly effectiveLooks: number | null;
  readonly codes: readonly CodeCount[];
  readonly warnings: readonly Warning[];
  readonly why: Why;
}

export interface LessonPartShare extends Share {
  readonly lessonPart: string | null;
}

/** One phase of a session: the report's row, completed for screens. */
export interface PhaseDetails {
  readonly row: OnTaskSession;
  readonly missingBy: readonly MissingFor[];
  readonly children: readonly ChildDetails[];
  readonly lessonParts: readonly LessonPartShare[];
  readonly codes: readonly CodeCount[];
  /** Of the intervals scored off-task, how many by which code. */
  readonly offTask: readonly CodeCount[];
  readonly late: number;
  readonly amended: number;
  readonly warnings: readonly Warning[];
}

export interface SessionDetails {
  readonly session: string;
  readonly planned: number;
  readonly scored: number;
  readonly missing: number;
  readonly missingBy: readonly MissingFor[];
  readonly late: number;
  /** False for a session whose journal stops before it was ended. */
  readonly ended: boolean;
  readonly phases: readonly PhaseDetails[];
  readonly timing: TimingFacts | null;
  readonly warnings: readonly Warning[];
}

/** Everything that screens say of one session. Counts here are intervals, whatever the method. */
export function sessionDetails(session: StoredSession): SessionDetails {
  const records = sessionRecords(session);
  const looks = records.flatMap((record) => record.looks);
  const first = records[0];
  const ended = first?.state.ended != null;
  return {
    session: session.header.id,
    planned: looks.length,
    scored: looks.filter(isScored).length,
    missing: looks.filter((look) => !isScored(look)).length,
    missingBy: missingByReason(looks),
    late: looks.filter((look) => look.late).length,
    ended,
    phases: records.map(phaseDetails),
    timing: first === undefined ? null : timingFacts(first, looks),
    warnings: [
      ...(first === undefined ? [] : methodWarnings(first)),
      ...(ended || first?.laid !== true ? [] : [warning('neverEnded')]),
    ],
  };
}

const isScored = (look: Look): boolean => look.status === 'scored';

export function phaseDetails(record: SessionRecord): PhaseDetails {
  const row = onTaskSession(record);
  const codes = codeCounts(record, record.looks);
  const offTask = codes.filter(({ role }) => role === 'off-task');
  const allOff = record.looks.filter((look) => look.as === 'off').length;
  const parts = [...new Set(record.looks.map((look) => look.lessonPart))].sort(byText);
  return {
    row,
    missingBy: missingByReason(record.looks),
    children: byChild(record).map(({ id, child, looks }) => childDetails(record, id, child, looks)),
    lessonParts: parts.map((lessonPart) => ({
      lessonPart,
      ...shareOf(
        tallyOf(
          record.looks.filter((look) => look.lessonPart === lessonPart),
          record.method,
        ),
        record.method,
      ),
    })),
    codes,
    offTask: offTask.map((code) => ({ ...code, percent: allOff === 0 ? null : (100 * code.n) / allOff })),
    late: record.looks.filter((look) => look.late).length,
    amended: record.looks.filter((look) => look.amended).length,
    // A headcount's row counts children; what is missing are scans.
    warnings: shareWarnings({
      ...row,
      ...(record.method === 'headcount' && {
        scored: record.looks.filter(isScored).length,
        missing: record.looks.filter((look) => !isScored(look)).length,
      }),
    }),
  };
}

function childDetails(
  record: SessionRecord,
  id: string,
  child: string,
  looks: readonly Look[],
): ChildDetails {
  const { why, ...share } = shareOf(tallyOf(looks, record.method), record.method);
  const counted = looks.filter((look) => look.as === 'on' || look.as === 'off');
  const enough = record.method === 'momentary' && counted.length >= limits.looksOfChild;
  const r = enough ? lagOneAutocorrelation(counted.map((look) => (look.as === 'on' ? 1 : 0))) : Number.NaN;
  const { figures, why: whyNot } = settle(
    { autocorrelation: r, effectiveLooks: Math.min(counted.length, effectiveLooks(counted.length, r)) },
    () => (record.method !== 'momentary' ? 'notMomentary' : enough ? 'alwaysTheSame' : 'tooFewLooks'),
  );
  const scored = looks.filter(isScored).length;
  const few = record.method !== 'duration' && scored < limits.looksOfChild;
  return {
    id,
    child,
    ...share,
    missingBy: missingByReason(looks),
    ...figures,
    codes: codeCounts(record, looks),
    warnings: few ? [warning('fewLooksForChild', { looks: scored })] : [],
    why: { ...why, ...whyNot },
  };
}
