import { roleOfLabel } from './codeRoles.ts';
import { addRow, type SessionRows } from './groupRows.ts';
import { excerpt, fault } from './problemValues.ts';
import { RowReader } from './RowReader.ts';
import { type HeaderRow, readHeaderRow } from './readHeaderRow.ts';
import { readTableRow } from './readTableRow.ts';
import { type CsvFault, detectDelimiter, scanCsv } from './scanCsv.ts';
import { tableColumns } from './tableColumns.ts';
import { tableIds } from './tableIds.ts';
import { tableRecords } from './tableRecords.ts';
import { tableSession } from './tableSession.ts';
import type { Bundle, ReadOptions } from './types.ts';

export type TableOutcome =
  | { readonly ok: true; readonly bundle: Bundle; readonly notices: CsvFault[] }
  | { readonly ok: false; readonly stop: CsvFault; readonly askRoles?: string[] };

const knownNames: ReadonlySet<string> = new Set(tableColumns);

/** An interval table as sessions. Reading stops at the first thing that is wrong. Linear in the length of the text. */
export function readTable(text: string, options: ReadOptions = {}): TableOutcome {
  const delimiter = detectDelimiter(text, knownNames);
  const sessions = new Map<string, SessionRows>();
  let header: HeaderRow | null = null;
  let reader: RowReader | null = null;
  let headerLine = 1;
  const keep: number[] = [];
  const stop = scanCsv(text, delimiter, (cells, line) => {
    if (header === null) {
      const read = readHeaderRow(cells);
      if (!read.ok) return { line, fault: read.fault };
      header = read.header;
      headerLine = line;
      for (const name of options.keepColumns ?? [])
        keep.push(header.others.find((other) => other.name === name)?.place ?? -1);
      return null;
    }
    if (cells.every((cell) => cell.trim() === '')) return null;
    if (cells.length !== header.width)
      return { line, fault: fault('table.ragged', { cells: cells.length, columns: header.width }) };
    reader ??= new RowReader(header.places, delimiter !== ',');
    reader.begin(cells);
    const row = readTableRow(
      reader,
      line,
      keep.map((place) => (cells[place] ?? '').trim()),
    );
    const wrong = reader.fault ?? addRow(sessions, row);
    return wrong === null ? null : { line, fault: wrong };
  });
  if (stop !== null) return { ok: false, stop };
  if (sessions.size === 0) return { ok: false, stop: { line: headerLine, fault: fault('table.noRows', {}) } };
  const unknown = labelsWithoutRole(sessions, options);
  const [first] = unknown;
  if (first !== undefined) {
    const askRoles = unknown.map(({ label }) => label);
    const labels = excerpt(askRoles.join(', '));
    return {
      ok: false,
      askRoles,
      stop: { line: first.line, fault: fault('table.roleUnknown', { labels, n: unknown.length }) },
    };
  }
  const ids = tableIds(options);
  const stored = [...sessions.values()].map((rows) => tableSession(rows, ids, options));
  const dropped = ((header as HeaderRow | null)?.others ?? [])
    .map(({ name }) => name)
    .filter((name) => !options.keepColumns?.includes(name));
  const values = { columns: dropped.map(excerpt).join(', '), n: dropped.length };
  const notices =
    dropped.length === 0 ? [] : [{ line: headerLine, fault: fault('table.columnsDropped', values) }];
  const { classes, observers } = tableRecords(stored, options);
  return {
    ok: true,
    bundle: { study: null, classes, observers, protocols: [], sessions: stored, visitPlans: [] },
    notices,
  };
}

function labelsWithoutRole(
  sessions: ReadonlyMap<string, SessionRows>,
  options: ReadOptions,
): { label: string; line: number }[] {
  const lines = new Map<string, number>();
  for (const { rows } of sessions.values())
    for (const { labels, line } of rows)
      for (const label of labels)
        if (line < (lines.get(label) ?? Number.POSITIVE_INFINITY)) lines.set(label, line);
  return [...lines]
    .filter(([label]) => roleOfLabel(label, options) === null)
    .map(([label, line]) => ({ label, line }))
    .sort((a, b) => a.line - b.line);
}
