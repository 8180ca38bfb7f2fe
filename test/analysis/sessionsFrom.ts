import { readIncoming } from '../../src/exchange/readIncoming.ts';
import type { ReadOptions } from '../../src/exchange/types.ts';
import type { StoredSession } from '../../src/journal/stored.ts';

/** A row of an interval table by column name. */
export type Row = Readonly<Record<string, string | number>>;

/** The CSV text of rows. */
export function csvOf(rows: readonly Row[], delimiter = ','): string {
  const columns = [...new Set(rows.flatMap((row) => Object.keys(row)))];
  for (const needed of ['session', 'observer', 'child', 'interval', 'code'])
    if (!columns.includes(needed)) columns.push(needed);
  const lines = rows.map((row) => columns.map((column) => row[column] ?? '').join(delimiter));
  return `${[columns.join(delimiter), ...lines].join('\r\n')}\r\n`;
}

/** Sessions as they come out of an interval table of these rows. */
export async function sessionsFrom(
  rows: readonly Row[],
  options: ReadOptions = {},
): Promise<StoredSession[]> {
  const bytes = new TextEncoder().encode(csvOf(rows));
  const outcome = await readIncoming({ name: 'rows.csv', bytes }, options);
  if (!outcome.ok) throw new Error(JSON.stringify(outcome.problems));
  return outcome.bundle.sessions;
}

/**
 * Rows of one session, momentary, one child after the other: `1` on-task, `0` off-task, `.` missed. Each string of
 * `looks` is one child's series; `child` names them C1, C2 … unless given.
 */
export function looksOf(facts: Row, looks: Readonly<Record<string, string>>): Row[] {
  const children = Object.entries(looks);
  const longest = Math.max(...children.map(([, series]) => series.length));
  return Array.from({ length: longest }, (_, k) =>
    children.flatMap(([child, series], place) => {
      const look = series[k];
      if (look === undefined) return [];
      return [
        {
          observer: 'Quill',
          ...facts,
          child,
          interval: k * children.length + place + 1,
          code: look === '1' ? 'on-task' : look === '0' ? 'off-task' : '',
          missing: look === '.' ? 'missed' : '',
        },
      ];
    }),
  ).flat();
}

/** Two observers' rows with these counts: both on-task, only the first, only the second, neither. */
export function pairOf(
  [both, onlyA, onlyB, neither]: readonly [number, number, number, number],
  facts: Row = {},
): Row[] {
  const a = '1'.repeat(both + onlyA) + '0'.repeat(onlyB + neither);
  const b = '1'.repeat(both) + '0'.repeat(onlyA) + '1'.repeat(onlyB) + '0'.repeat(neither);
  return [
    ...looksOf({ session: 'a', observer: 'Marsh', visit: 'v1', ...facts }, { 'Otter-01': a }),
    ...looksOf({ session: 'b', observer: 'Quill', visit: 'v1', ...facts }, { 'Otter-01': b }),
  ];
}
