import { childrenOf, recordingFacts } from '../journal/headerFacts.ts';
import { type IntervalRecord, readOut } from '../journal/readOut.ts';
import { fold } from '../journal/step.ts';
import type { StoredSession } from '../journal/stored.ts';
import { guarded, quotedCell } from './csvCell.ts';
import { type TableColumn, tableColumns } from './tableColumns.ts';
import type { TableOptions } from './types.ts';

type Cell = string | number | null;

/** What is text in a table: a spreadsheet must not run it. The other columns are numbers, dates and fixed words. */
const textColumns: ReadonlySet<TableColumn> = new Set([
  'session',
  'observer',
  'child',
  'code',
  'class',
  'condition',
  'phase',
  'visit',
  'study',
  'lesson_part',
] as const);

/**
 * Sessions as an interval table (RFC 4180, lines end in CR LF), one row an interval, as they stand after
 * corrections; one that never ended is read as if it had ended where its journal stops.
 */
export function writeIntervalTable(sessions: readonly StoredSession[], options: TableOptions = {}): string {
  const delimiter = options.delimiter ?? ',';
  const decimal = delimiter === ',' ? '.' : (options.decimal ?? (delimiter === ';' ? ',' : '.'));
  const cellOf = (column: TableColumn, value: Cell): string => {
    if (value === null) return '';
    if (typeof value === 'number') return Number.isNaN(value) ? '' : String(value).replace('.', decimal);
    return quotedCell(textColumns.has(column) ? guarded(value) : value, delimiter);
  };
  const lines = [tableColumns.join(delimiter)];
  for (const session of sessions) {
    const { common, rows } = cellsOf(session);
    // What all rows share is written out once: a table may have hundreds of thousands of rows.
    const shared = tableColumns.map((column) => cellOf(column, common[column] ?? null));
    for (const row of rows) {
      const cells = [...shared];
      for (const [place, column, value] of row) cells[place] = cellOf(column, value);
      lines.push(cells.join(delimiter));
    }
  }
  return `${lines.join('\r\n')}\r\n`;
}

type Placed = readonly [place: number, column: TableColumn, value: Cell];

const placed = (column: TableColumn): ((value: Cell) => Placed) => {
  const place = tableColumns.indexOf(column);
  return (value) => [place, column, value];
};
const child = placed('child');
const interval = placed('interval');
const code = placed('code');
const missing = placed('missing');
const phase = placed('phase');
const round = placed('round');
const startS = placed('start_s');
const endS = placed('end_s');
const lessonPart = placed('lesson_part');
const minutesFromBreak = placed('minutes_from_break');
const onCount = placed('on_count');
const presentCount = placed('present_count');

function cellsOf({ header, journal }: StoredSession): {
  common: Partial<Record<TableColumn, Cell>>;
  rows: Placed[][];
} {
  const state = fold(header, journal);
  const facts = recordingFacts(header);
  const listed = header.schedule.kind === 'listed' ? header.schedule.intervals : null;
  const pseudonyms = new Map(childrenOf(header).map(({ id, pseudonym }) => [id, pseudonym]));
  const labels = new Map(facts.codeSet.codes.map(({ id, label }) => [id, label]));
  const started = state.entries.find((entry) => entry.kind === 'started');
  const common = {
    session: header.sessionLabel ?? header.id,
    observer: header.observer.name,
    role: header.role,
    class: header.classroom.name,
    condition: header.condition,
    // A table that named no visit gets none; a visit made here is its identifier, which reading knows again.
    visit: header.visitLabel ?? (listed === null ? header.visit : null),
    date: header.date,
    start: listed === null ? (started?.wall ?? header.plannedStart) : header.plannedStart,
    study: header.studyLabel ?? (listed === null ? header.study : null),
    method: facts.method,
    interval_s: seconds(facts.intervalMs),
    observe_s: seconds(facts.observeMs),
  };
  const endOf = (record: IntervalRecord, i: number): number | null =>
    listed !== null ? (listed[i]?.endMs ?? null) : facts.method === 'duration' ? record.closeAt : null;
  const rows = readOut(state, { final: true }).map((record, i) => [
    child(record.child === null ? null : (pseudonyms.get(record.child) ?? record.child)),
    interval(record.number),
    code(codeCell(record, labels)),
    missing(record.missing),
    phase(record.phase),
    round(record.round),
    startS(seconds(record.openAt)),
    endS(seconds(endOf(record, i))),
    lessonPart(record.lessonPart),
    minutesFromBreak(record.minutesFromBreak),
    onCount(record.counts?.on ?? null),
    presentCount(record.counts?.present ?? null),
  ]);
  return { common, rows };
}

/** Labels joined by `|`, which therefore cannot be part of one. */
function codeCell({ codes }: IntervalRecord, labels: ReadonlyMap<string, string>): string | null {
  return codes?.map((id) => (labels.get(id) ?? id).replaceAll('|', '/')).join('|') ?? null;
}

function seconds(ms: number | null): number | null {
  return ms === null ? null : Math.round(ms * 1000) / 1e6;
}
