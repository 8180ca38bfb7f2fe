import * as z from 'zod/mini';
import { isoDate, wallTime } from '../model/common.ts';
import { unguarded } from './csvCell.ts';
import { excerpt, type Fault, fault, type ProblemCode, type ProblemValues } from './problemValues.ts';
import type { TableColumn } from './tableColumns.ts';

/** Characters of a name or a label. */
const longestText = 200;
/** Seconds or minutes beyond this are damage, and no clock could be counted from them. */
const largest = 1e7;

/**
 * Takes the cells of one row after the other as what they should be, and keeps the first fault of a row. An empty
 * cell, or one whose column is not there, is null.
 */
export class RowReader {
  fault: Fault | null = null;
  private cells: readonly string[] = [];
  /** Dates and starts that were found right: the rows of a session all have the same. */
  private readonly right = new Set<string>();

  constructor(
    private readonly places: ReadonlyMap<TableColumn, number>,
    /** Whether a comma can be the decimal sign (it cannot where it separates the cells). */
    private readonly decimalComma: boolean,
  ) {}

  /** Goes on to the next row. */
  begin(cells: readonly string[]): void {
    this.cells = cells;
    this.fault = null;
  }

  private raw(column: TableColumn): string {
    const place = this.places.get(column);
    return place === undefined ? '' : (this.cells[place] ?? '').trim();
  }

  refuse<Code extends ProblemCode>(code: Code, values: ProblemValues[Code]): null {
    this.fault ??= fault(code, values);
    return null;
  }

  text(column: TableColumn): string | null {
    const text = unguarded(this.raw(column)).trim();
    this.checkLength(column, text);
    return text === '' ? null : text;
  }

  private checkLength(column: TableColumn, text: string): void {
    const { length } = text;
    if (length > longestText) this.refuse('table.textTooLong', { column, length, most: longestText });
  }

  /** Labels joined by `|`, each once. */
  labels(): string[] {
    const text = unguarded(this.raw('code'));
    if (!text.includes('|') && text.length <= longestText) return text === '' ? [] : [text.trim()];
    const labels = new Set(text.split('|').map((label) => label.trim()));
    labels.delete('');
    for (const label of labels) this.checkLength('code', label);
    return [...labels];
  }

  needed(column: TableColumn): string {
    return this.text(column) ?? this.refuse('table.needed', { column }) ?? '';
  }

  /** One of a fixed list of words, in whatever case. */
  word<Word extends string>(column: TableColumn, words: readonly Word[]): Word | null {
    const raw = this.raw(column);
    if (raw === '') return null;
    const lower = raw.toLowerCase();
    const word = words.find((known) => known === lower);
    return word ?? this.refuse('table.word', { column, found: excerpt(raw), expected: words.join(', ') });
  }

  number(column: TableColumn): number | null {
    const raw = this.raw(column);
    if (raw === '') return null;
    const plain = this.decimalComma ? raw.replace(',', '.') : raw;
    const value = /^[+-]?\d+(?:\.\d+)?(?:[eE][+-]?\d+)?$/.test(plain) ? Number(plain) : Number.NaN;
    if (!(Math.abs(value) <= largest)) return this.refuse('table.number', { column, found: excerpt(raw) });
    // −0 is written as 0.
    return value === 0 ? 0 : value;
  }

  notNegative(column: TableColumn): number | null {
    const value = this.number(column);
    if (value === null || value >= 0) return value;
    return this.refuse('table.notNegative', { column, found: excerpt(this.raw(column)) });
  }

  positive(column: TableColumn): number | null {
    const value = this.number(column);
    if (value === null || value > 0) return value;
    return this.refuse('table.positive', { column, found: excerpt(this.raw(column)) });
  }

  /** A whole number, 0 or more. */
  whole(column: TableColumn): number | null {
    const raw = this.raw(column);
    if (raw === '') return null;
    if (/^\d{1,9}$/.test(raw)) return Number(raw);
    return this.refuse('table.whole', { column, found: excerpt(raw) });
  }

  interval(): number {
    const raw = this.raw('interval');
    const value = /^\d{1,9}$/.test(raw) ? Number(raw) : 0;
    return value > 0 ? value : (this.refuse('table.interval', { found: excerpt(raw) }) ?? 0);
  }

  date(): string | null {
    const raw = this.raw('date');
    if (raw === '' || this.right.has(raw)) return raw === '' ? null : raw;
    if (!z.safeParse(isoDate, raw).success || !isCalendarDate(raw))
      return this.refuse('table.date', { column: 'date', found: excerpt(raw) });
    this.right.add(raw);
    return raw;
  }

  /** Date and time with offset. */
  start(): string | null {
    const raw = this.raw('start');
    // A date alone is no start, even where the same text was right as a date.
    if (raw === '' || (raw.length > 10 && this.right.has(raw))) return raw === '' ? null : raw;
    const inForm = z.safeParse(wallTime, raw).success && isCalendarDate(raw.slice(0, 10));
    if (!inForm || Number.isNaN(Date.parse(raw))) return this.refuse('table.start', { found: excerpt(raw) });
    this.right.add(raw);
    return raw;
  }
}

/** True for a day that the calendar has: engines read 30 February as 2 March. */
function isCalendarDate(text: string): boolean {
  const epoch = Date.parse(`${text}T00:00:00Z`);
  if (text < '1900' || text > '2999') return false;
  return !Number.isNaN(epoch) && new Date(epoch).toISOString().slice(0, 10) === text;
}
