import { type MissingReason, missingReasons } from '../model/missing.ts';
import { type Method, methods } from '../model/protocol.ts';
import type { Role } from '../model/session.ts';
import { excerpt } from './problemValues.ts';
import type { RowReader } from './RowReader.ts';

/** One row of an interval table: times in seconds, null where the table says nothing. */
export interface TableRow {
  readonly line: number;
  readonly session: string;
  readonly observer: string;
  /** null for a headcount of everybody */
  readonly child: string | null;
  readonly interval: number;
  /** Labels, each once. */
  readonly labels: readonly string[];
  readonly missing: MissingReason | null;
  readonly role: Role | null;
  readonly class: string | null;
  readonly condition: string | null;
  readonly phase: string | null;
  readonly visit: string | null;
  readonly date: string | null;
  readonly start: string | null;
  readonly study: string | null;
  readonly round: number | null;
  readonly start_s: number | null;
  readonly end_s: number | null;
  readonly method: Method;
  readonly interval_s: number | null;
  readonly observe_s: number | null;
  readonly lesson_part: string | null;
  readonly minutes_from_break: number | null;
  readonly on_count: number | null;
  readonly present_count: number | null;
  /** Cells of unknown columns that somebody ticked. */
  readonly kept: readonly string[];
}

/** Takes a row as what its columns should hold; the first thing that is not so is the reader's fault. */
export function readTableRow(cells: RowReader, line: number, kept: readonly string[]): TableRow {
  const row: TableRow = {
    line,
    session: cells.needed('session'),
    observer: cells.needed('observer'),
    child: cells.text('child'),
    interval: cells.interval(),
    labels: cells.labels(),
    missing: cells.word('missing', missingReasons),
    role: cells.word('role', ['primary', 'second']),
    class: cells.text('class'),
    condition: cells.text('condition'),
    phase: cells.text('phase'),
    visit: cells.text('visit'),
    date: cells.date(),
    start: cells.start(),
    study: cells.text('study'),
    round: cells.whole('round'),
    start_s: cells.notNegative('start_s'),
    end_s: cells.notNegative('end_s'),
    method: cells.word('method', methods) ?? 'momentary',
    interval_s: cells.positive('interval_s'),
    observe_s: cells.positive('observe_s'),
    lesson_part: cells.text('lesson_part'),
    minutes_from_break: cells.number('minutes_from_break'),
    on_count: cells.whole('on_count'),
    present_count: cells.whole('present_count'),
    kept,
  };
  if (cells.fault === null) checkTogether(cells, row);
  return row;
}

/** What the cells of a row have to be to one another. */
function checkTogether(cells: RowReader, row: TableRow): void {
  const { method, missing, on_count: on, present_count: present, start_s: start, end_s: end } = row;
  const headcount = method === 'headcount';
  const code = excerpt(row.labels.join('|'));
  if (row.child === null && !headcount) cells.refuse('table.noChild', {});
  if (missing !== null && (row.labels.length > 0 || on !== null || present !== null))
    cells.refuse('table.codeAndMissing', { code: code === '' ? String(on ?? present) : code, missing });
  if (headcount && row.labels.length > 0) cells.refuse('table.headcountCode', { code });
  if (!headcount && (on !== null || present !== null)) cells.refuse('table.countsElsewhere', { method });
  if (headcount && missing === null && (on === null || present === null)) cells.refuse('table.counts', {});
  if (on !== null && present !== null && on > present) cells.refuse('table.countsOver', { on, present });
  if ((method === 'momentary' || method === 'duration') && row.labels.length === 0 && missing === null)
    cells.refuse('table.noCode', {});
  if (method === 'momentary' && row.labels.length > 1) cells.refuse('table.severalCodes', { code });
  if (row.observe_s !== null && row.interval_s !== null && row.observe_s > row.interval_s)
    cells.refuse('table.observeOver', { observe: row.observe_s, interval: row.interval_s });
  if (method === 'duration' && missing === null && (start === null || end === null))
    cells.refuse('table.durationTimes', {});
  if (start !== null && end !== null && end < start) cells.refuse('table.endBeforeStart', { start, end });
}
