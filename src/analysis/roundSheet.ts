import type { MissingReason } from '../model/missing.ts';
import { byText } from './order.ts';
import { scoredAs } from './pairedLooks.ts';
import type { Counting, Look, SessionRecord } from './sessionRecord.ts';

/** What one observer has in a cell. */
export interface CellMark {
  /** `none` = observed, nothing occurred (partial and whole interval). */
  readonly state: Counting | 'none' | 'counts' | 'missing';
  /** Labels of the codes scored. */
  readonly codes: readonly string[];
  /** Places of these codes in the record's code set, for shapes; −1 for a code that is not in it. */
  readonly codeIndexes: readonly number[];
  readonly counts: { readonly on: number; readonly present: number } | null;
  readonly missing: MissingReason | null;
  readonly late: boolean;
  readonly amended: boolean;
}

export interface SheetCell {
  readonly number: number;
  /** Session time of the look in ms; null where unknown. */
  readonly at: number | null;
  readonly lessonPart: string | null;
  readonly mark: CellMark;
  /** The second observer's, when one was given and has this interval. */
  readonly second: CellMark | null;
  /** Both scored it, and not the same. */
  readonly differs: boolean;
}

export interface SheetRow {
  /** Pseudonym; null for a headcount's only row. */
  readonly child: string | null;
  /** The child's first, second … look; null where the child had fewer looks than others. */
  readonly cells: readonly (SheetCell | null)[];
}

/** One phase of a session as a sheet: one row a child in the order of the schedule, one column a look of each child. */
export interface RoundSheet {
  readonly phase: string | null;
  readonly columns: number;
  readonly rows: readonly SheetRow[];
}

/** The round sheet of one record; with the second observer's record of the same visit, cells are split where they differ. */
export function roundSheet(record: SessionRecord, second: SessionRecord | null = null): RoundSheet {
  const others = second === null ? null : looksByKey(second);
  const labels = labelsOf(record);
  const order = record.children.map(({ label }) => label);
  const rows = new Map<string | null, SheetCell[]>();
  for (const look of record.looks) {
    const child = look.child === null ? null : (labels.get(look.child) ?? look.child);
    const other = others?.get(keyOf(child, look.number)) ?? null;
    const cells = rows.get(child) ?? [];
    cells.push({
      number: look.number,
      at: Number.isNaN(look.cueAt) ? null : look.cueAt,
      lessonPart: look.lessonPart,
      mark: markOf(look, record),
      second: other === null || second === null ? null : markOf(other, second),
      differs:
        other !== null &&
        look.status === 'scored' &&
        other.status === 'scored' &&
        scoredAs(look) !== scoredAs(other),
    });
    rows.set(child, cells);
  }
  const columns = [...rows.values()].reduce((most, cells) => Math.max(most, cells.length), 0);
  const place = (child: string | null): number => {
    const at = child === null ? -1 : order.indexOf(child);
    return at < 0 ? order.length : at;
  };
  return {
    phase: record.phase,
    columns,
    rows: [...rows]
      .sort(([a], [b]) => place(a) - place(b) || byText(a, b))
      .map(([child, cells]) => ({
        child,
        cells: Array.from({ length: columns }, (_, k) => cells[k] ?? null),
      })),
  };
}

const keyOf = (child: string | null, number: number): string => JSON.stringify([child, number]);

function labelsOf(record: SessionRecord): Map<string, string> {
  return new Map(record.children.map(({ id, label }) => [id, label]));
}

function looksByKey(record: SessionRecord): Map<string, Look> {
  const labels = labelsOf(record);
  return new Map(
    record.looks.map((look) => [
      keyOf(look.child === null ? null : (labels.get(look.child) ?? look.child), look.number),
      look,
    ]),
  );
}

function markOf(look: Look, { facts }: SessionRecord): CellMark {
  const codes = look.labels ?? [];
  return {
    state: stateOf(look),
    codes,
    codeIndexes: codes.map((code) => facts.codeSet.codes.findIndex(({ label }) => label === code)),
    counts: look.counts,
    missing: look.status === 'scored' ? null : look.missing,
    late: look.late,
    amended: look.amended,
  };
}

function stateOf(look: Look): CellMark['state'] {
  if (look.status !== 'scored') return 'missing';
  if (look.counts !== null) return 'counts';
  return look.labels?.length === 0 ? 'none' : (look.as ?? 'other');
}
