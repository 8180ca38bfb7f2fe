import { scanCsv } from '../../src/exchange/scanCsv.ts';

/** The rows of a delimited text by column name, raw. */
export function rowsOf(text: string, delimiter = ','): Record<string, string>[] {
  const rows: string[][] = [];
  scanCsv(text, delimiter, (cells) => {
    rows.push(cells);
    return null;
  });
  const [names = [], ...rest] = rows;
  return rest.map((cells) => Object.fromEntries(names.map((name, i) => [name, cells[i] ?? ''])));
}

/** Rows by column name as an RFC 4180 text. */
export function tableOf(rows: readonly Record<string, string>[], delimiter = ','): string {
  const names = Object.keys(rows[0] ?? {});
  const cell = (text: string): string => `"${text.replaceAll('"', '""')}"`;
  return [names, ...rows.map((row) => names.map((name) => row[name] ?? ''))]
    .map((cells) => cells.map(cell).join(delimiter))
    .join('\r\n');
}
