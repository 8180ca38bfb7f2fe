import { excerpt, type Fault, fault } from './problemValues.ts';
import type { TableRow } from './readTableRow.ts';
import { sessionColumns } from './tableColumns.ts';

/** The rows of one session. */
export interface SessionRows {
  readonly first: TableRow;
  readonly rows: TableRow[];
  /** Lines by child and interval. */
  readonly seen: Map<string, number>;
}

/** Puts a row to its session; says what keeps it from belonging there. Sessions stand in order of appearance. */
export function addRow(sessions: Map<string, SessionRows>, row: TableRow): Fault | null {
  const group = sessions.get(row.session) ?? { first: row, rows: [], seen: new Map<string, number>() };
  const { first, seen } = group;
  if (first.observer !== row.observer) {
    const values = {
      session: excerpt(row.session),
      first: excerpt(first.observer),
      found: excerpt(row.observer),
    };
    return fault('table.twoObservers', values);
  }
  for (const column of sessionColumns) {
    if (first[column] === row[column]) continue;
    const [was, is] = [first[column], row[column]].map((value) => excerpt(String(value ?? '')));
    return fault('table.varies', {
      column,
      session: excerpt(row.session),
      first: was ?? '',
      found: is ?? '',
    });
  }
  const key = `${row.interval} ${row.child ?? ''}`;
  const firstLine = seen.get(key);
  if (firstLine !== undefined) {
    const child = excerpt(row.child ?? '');
    return fault('table.twice', { session: excerpt(row.session), child, interval: row.interval, firstLine });
  }
  seen.set(key, row.line);
  group.rows.push(row);
  sessions.set(row.session, group);
  return null;
}
