import type { Method } from '../model/protocol.ts';
import { byChild } from './byChild.ts';
import { byRecord } from './order.ts';
import type { Analysed } from './remark.ts';
import type { SessionRecord } from './sessionRecord.ts';
import { percentOf, type Share, shareOf, tallyOf } from './tally.ts';
import type { Why } from './why.ts';

export interface OnTaskChild extends Share {
  readonly child: string;
}

/** One session in one phase. `classPercent` is the mean of the children's percentages, `percentOnTask` all looks together. */
export interface OnTaskSession extends Omit<Share, 'why'> {
  readonly session: string;
  readonly visit: string | null;
  readonly class: string | null;
  readonly condition: string | null;
  readonly phase: string | null;
  readonly observer: string;
  readonly method: Method;
  readonly classPercent: number | null;
  readonly children: readonly OnTaskChild[];
  readonly why: Why;
}

export interface OnTaskReport {
  readonly sessions: readonly OnTaskSession[];
}

/** Percent on-task of every session and phase: the document of `ontask` (units: 0–100). */
export function onTaskReport(records: readonly SessionRecord[]): Analysed<OnTaskReport> {
  return {
    report: { sessions: [...records].sort(byRecord).map(onTaskSession) },
    problems: [],
    notices: [],
  };
}

/** The row of one record. */
export function onTaskSession(record: SessionRecord): OnTaskSession {
  const { method } = record;
  const total = tallyOf(record.looks, method);
  const groups = byChild(record).map(({ child, looks }) => ({ child, tally: tallyOf(looks, method) }));
  const percents = groups.map(({ tally }) => percentOf(tally)).filter(Number.isFinite);
  const { why, ...share } = shareOf(total, method);
  const classPercent =
    percents.length === 0 ? null : percents.reduce((sum, percent) => sum + percent, 0) / percents.length;
  return {
    session: record.label,
    visit: record.visit,
    class: record.className,
    condition: record.condition,
    phase: record.phase,
    observer: record.observer,
    method,
    ...share,
    classPercent,
    children: groups.map(({ child, tally }) => ({ child, ...shareOf(tally, method) })),
    why: {
      ...why,
      ...(classPercent === null && {
        classPercent:
          method === 'headcount'
            ? ('headcountHasNoChildren' as const)
            : (why.percentOnTask ?? 'nothingScored'),
      }),
    },
  };
}
