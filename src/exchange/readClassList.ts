import { ok, type Problem, type Result } from '../kernel/result.ts';
import { unguarded } from './csvCell.ts';
import { excerpt, fault, type ProblemCode, type ProblemValues } from './problemValues.ts';
import { columnName, detectDelimiter, firstRow, scanCsv } from './scanCsv.ts';
import type { ClassList, ListedChild } from './types.ts';

const columns = ['child', 'consent', 'stratum', 'seat'] as const;
type Column = (typeof columns)[number];

const yes = new Set(['yes', 'y', 'true', '1', 'x', '✓', 'given']);
const no = new Set(['no', 'n', 'false', '0', '', '-', 'not given', 'refused', 'withdrawn']);
const longest = 200;

/**
 * A class list: a CSV text with the columns child, consent, stratum, seat in any order (consent is needed), or pasted
 * lines without a header, which hold these in this order. An empty consent is none. Children without consent are
 * counted and go no further. Lines of pseudonyms alone say nothing of consent: `consentStated` is then false.
 */
export function readClassList(text: string): Result<ClassList> {
  const clean = text.replace(/^\ufeff/, '');
  const delimiter = detectDelimiter(clean, new Set(columns));
  const first = firstRow(clean, delimiter);
  if (first === null) return refuse('classList.noRows', { line: 1 });
  const names = first.cells.map(columnName);
  const headed = names.includes('child') || names.includes('consent');
  const places = new Map<Column, number>();
  for (const [i, column] of columns.entries()) {
    const place = headed ? names.indexOf(column) : i < names.length ? i : -1;
    if (place >= 0) places.set(column, place);
  }
  const absent = (['child', 'consent'] as const).filter((column) => headed && !places.has(column));
  if (absent.length > 0) {
    const found = excerpt(first.cells.join(', '));
    return refuse('classList.columns', { absent: absent.join(', '), found, line: first.line });
  }
  const consentStated = places.has('consent');
  const children: ListedChild[] = [];
  const lines = new Map<string, number>();
  let leftOut = 0;
  let wrong: Problem | null = null;
  const stop = <Code extends ProblemCode>(line: number, code: Code, values: ProblemValues[Code]) => {
    wrong = fault(code, values);
    return { line, fault: fault('table.noRows', {}) };
  };
  let rows = 0;
  const broken = scanCsv(clean, delimiter, (cells, line) => {
    if (headed && rows++ === 0) return null;
    const cell = (column: Column): string => {
      const place = places.get(column);
      return place === undefined ? '' : unguarded((cells[place] ?? '').trim()).trim();
    };
    if (cells.every((one) => one.trim() === '')) return null;
    if (cells.length > names.length || (headed && cells.length < names.length))
      return stop(line, 'classList.cells', { cells: cells.length, columns: names.length, line });
    const consent = consentStated ? cell('consent').toLowerCase() : 'yes';
    if (no.has(consent)) {
      leftOut++;
      return null;
    }
    if (!yes.has(consent)) return stop(line, 'classList.consent', { found: excerpt(consent), line });
    const pseudonym = cell('child');
    if (pseudonym === '') return stop(line, 'classList.noChild', { line });
    for (const column of columns) {
      // biome-ignore lint/suspicious/noControlCharactersInRegex: a NUL in a name is damage
      if (cell(column).length > longest || /\u0000/.test(cell(column)))
        return stop(line, 'classList.text', { column, most: longest, line });
    }
    const firstLine = lines.get(pseudonym);
    if (firstLine !== undefined)
      return stop(line, 'classList.twice', { pseudonym: excerpt(pseudonym), firstLine, line });
    lines.set(pseudonym, line);
    const [stratum, seat] = [cell('stratum') || null, cell('seat') || null];
    children.push({ pseudonym, consent: true, stratum, seat, line });
    return null;
  });
  if (wrong !== null) return { ok: false, problem: wrong };
  if (broken !== null) return refuse('classList.broken', { line: broken.line });
  if (children.length + leftOut === 0) return refuse('classList.noRows', { line: first.line });
  return ok({ children, leftOut, consentStated });
}

function refuse<Code extends ProblemCode>(code: Code, values: ProblemValues[Code]): Result<never> {
  return { ok: false, problem: fault(code, values) };
}
