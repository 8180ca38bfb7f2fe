import { lineBreaks } from './decodeText.ts';
import { excerpt, type Fault, fault } from './problemValues.ts';

export interface CsvFault {
  readonly line: number;
  readonly fault: Fault;
}

/** A cell longer than this is taken for damage. */
export const longestCell = 10_000;

const quote = 34;

/**
 * Reads delimited text row by row (RFC 4180; lines may end in CR LF, LF or CR, also mixed) in one pass. Lines
 * are physical ones, from 1: a quoted cell may hold line breaks, and a row is told by the line on which it begins.
 * Written here because sentences need these lines, and a mark where a quote is left open.
 * @param onRow takes the cells of a row; what it returns, if not null, ends the reading and is the result
 * @returns what stopped the reading, or null at the end of the text. Blank lines are passed over.
 */
export function scanCsv(
  text: string,
  delimiter: string,
  onRow: (cells: string[], line: number) => CsvFault | null,
): CsvFault | null {
  const separator = delimiter.charCodeAt(0);
  const end = text.length;
  let at = 0;
  let line = 1;
  while (at < end) {
    const rowLine = line;
    const cells: string[] = [];
    let quoted = false;
    for (;;) {
      let cell: string;
      if (text.charCodeAt(at) === quote) {
        quoted = true;
        const close = closingQuote(text, at);
        if (close < 0) return { line, fault: fault('table.quoteOpen', {}) };
        cell = text.slice(at + 1, close);
        if (cell.length > longestCell) return tooLong(cell.length, line);
        line += lineBreaks(text, at + 1, close);
        if (cell.includes('"')) cell = cell.replaceAll('""', '"');
        at = close + 1;
        const next = text.charCodeAt(at);
        if (at < end && next !== separator && next !== 10 && next !== 13) {
          const found = excerpt(text.slice(at, at + 20).split(/[\r\n]/, 1)[0] ?? '');
          return { line, fault: fault('table.quoteAfter', { found }) };
        }
      } else {
        const from = at;
        let c = text.charCodeAt(at);
        while (at < end && c !== separator && c !== 10 && c !== 13) c = text.charCodeAt(++at);
        if (at - from > longestCell) return tooLong(at - from, line);
        cell = text.slice(from, at);
      }
      cells.push(cell);
      if (at < end && text.charCodeAt(at) === separator) at++;
      else break;
    }
    if (at < end) {
      at += text.charCodeAt(at) === 13 && text.charCodeAt(at + 1) === 10 ? 2 : 1;
      line++;
    }
    if (cells.length === 1 && !quoted && cells[0]?.trim() === '') continue;
    const stop = onRow(cells, rowLine);
    if (stop !== null) return stop;
  }
  return null;
}

function tooLong(length: number, line: number): CsvFault {
  return { line, fault: fault('table.cellTooLong', { length, most: longestCell }) };
}

/** The quote that ends the cell which begins at `open`; two quotes are one of its characters. −1: none. */
function closingQuote(text: string, open: number): number {
  let at = open + 1;
  for (;;) {
    const next = text.indexOf('"', at);
    if (next < 0 || text.charCodeAt(next + 1) !== quote) return next;
    at = next + 2;
  }
}

/** The first row of a text, or null where it cannot be read with this delimiter. */
export function firstRow(text: string, delimiter: string): { cells: string[]; line: number } | null {
  let found: { cells: string[]; line: number } | null = null;
  scanCsv(text, delimiter, (cells, line) => {
    found = { cells, line };
    return { line, fault: fault('table.noRows', {}) };
  });
  return found;
}

/** Comma, semicolon or tab: the one with which the first row has most of the known names, then most cells. */
export function detectDelimiter(text: string, known: ReadonlySet<string>): ',' | ';' | '\t' {
  const [best] = ([',', ';', '\t'] as const)
    .map((delimiter) => {
      const cells = firstRow(text, delimiter)?.cells ?? [];
      return {
        delimiter,
        names: cells.filter((cell) => known.has(columnName(cell))).length,
        n: cells.length,
      };
    })
    .sort((a, b) => b.names - a.names || b.n - a.n);
  return best?.delimiter ?? ',';
}

/** A column's name as it is compared: trimmed, in small letters. */
export function columnName(cell: string): string {
  return cell.trim().toLowerCase();
}
