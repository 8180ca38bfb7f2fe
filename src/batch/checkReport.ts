import { recordsOf, visits } from '../analysis/index.ts';
import { byCodePoint } from '../kernel/compare.ts';
import type { TakenIn } from '../model/forTheRecord.ts';
import type { Words } from '../words/words.ts';
import type { Gathered } from './gather.ts';
import { fileProblemLine } from './problemLines.ts';
import { textTable } from './textTable.ts';

/** What `check` tells: every file, and what all of them together hold. */
export interface CheckReport {
  readonly files: readonly {
    readonly file: string;
    readonly form: string | null;
    readonly ok: boolean;
    readonly sessions: number;
    readonly problems: readonly string[];
    readonly notices: readonly string[];
  }[];
  readonly sessions: number;
  readonly visits: number;
  readonly classes: readonly string[];
  readonly observers: readonly string[];
  readonly phases: readonly string[];
  readonly conditions: readonly string[];
}

export function checkReport({ outcomes, merged }: Gathered, taken: TakenIn, words: Words): CheckReport {
  const { bundle } = merged;
  const records = recordsOf(bundle.sessions, taken);
  const distinct = (of: (record: (typeof records)[number]) => string | null): string[] =>
    [...new Set(records.flatMap((record) => of(record) ?? []))].sort(byCodePoint);
  return {
    files: outcomes.map((one) => ({
      file: one.file,
      form: one.ok ? one.form : null,
      ok: one.ok,
      sessions: one.ok ? one.bundle.sessions.length : 0,
      problems: one.ok ? [] : one.problems.map((found) => fileProblemLine(found, words)),
      notices: one.ok ? one.notices.map((found) => fileProblemLine(found, words)) : [],
    })),
    sessions: new Set(records.map(({ session }) => session)).size,
    visits: visits(records, bundle.study?.pairings ?? []).length,
    classes: distinct(({ className }) => className),
    observers: distinct(({ observer }) => observer),
    phases: distinct(({ phase }) => phase),
    conditions: distinct(({ condition }) => condition),
  };
}

export function textOfCheck(report: CheckReport, words: Words): string {
  const { batch, f } = words;
  const list = (names: readonly string[]): string =>
    names.length === 0 ? batch.undefinedMark : names.join(', ');
  return [
    batch.filesTitle,
    textTable(
      [{ head: batch.file }, { head: batch.form }, { head: batch.sessions, number: true }],
      report.files.map((one) => [one.file, one.form ?? batch.refused, f.whole(one.sessions)]),
    ),
    '',
    batch.found({
      sessions: report.sessions,
      visits: report.visits,
      classes: list(report.classes),
      observers: list(report.observers),
      phases: list(report.phases),
      conditions: list(report.conditions),
    }),
  ].join('\n');
}
