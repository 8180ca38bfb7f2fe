import type { OnTaskReport, Share } from '../analysis/index.ts';
import type { LookMoment } from '../model/protocol.ts';
import type { Words } from '../words/words.ts';
import { numbersFor } from './numbersFor.ts';
import { type Column, textTable } from './textTable.ts';

/**
 * The on-task report as tables for people.
 * @param lookAt at which end of the interval a session looked; the report's document does not hold it
 */
export function textOfOnTask(
  { sessions }: OnTaskReport,
  words: Words,
  lookAt: (session: string) => LookMoment | null = () => null,
): string {
  const { batch } = words;
  if (sessions.length === 0) return batch.nothingToReport;
  const { whole, decimal, range } = numbersFor(words);
  const shareCells = (share: Omit<Share, 'why'>): string[] => [
    whole(share.scored),
    whole(share.missing),
    whole(share.onTask),
    decimal(share.percentOnTask),
    range(share.lower, share.upper, decimal),
  ];
  const shareColumns: Column[] = [
    { head: batch.scored, number: true },
    { head: batch.missing, number: true },
    { head: batch.onTask, number: true },
    { head: batch.percentOnTask, number: true },
    { head: batch.limits, number: true },
  ];
  const names: Column[] = [
    batch.class,
    batch.condition,
    batch.visit,
    batch.phase,
    batch.observer,
    batch.session,
  ].map((head) => ({ head }));
  const nameCells = (row: OnTaskReport['sessions'][number]): string[] =>
    [row.class, row.condition, row.visit, row.phase, row.observer, row.session].map((cell) => cell ?? '');
  const sets = sessions.some(({ method }) => method === 'partial' || method === 'whole');
  return [
    batch.sessionsTitle,
    textTable(
      [...names, { head: batch.method }, ...shareColumns, { head: batch.classPercent, number: true }],
      sessions.map((row) => [
        ...nameCells(row),
        batch.methodCell({ method: row.method, lookAt: lookAt(row.session) }),
        ...shareCells(row),
        decimal(row.classPercent),
      ]),
    ),
    ...(sets ? [batch.someOnTask] : []),
    '',
    batch.childrenTitle,
    textTable(
      [...names, { head: batch.child }, ...shareColumns],
      sessions.flatMap((row) =>
        row.children.map((one) => [...nameCells(row), one.child, ...shareCells(one)]),
      ),
    ),
  ].join('\n');
}
