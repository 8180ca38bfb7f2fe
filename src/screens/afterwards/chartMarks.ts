import type { RoundSheet, CellMark as Said } from '../../analysis/index.ts';
import type { CellMark } from '../../charts/Mark.tsx';
import type { KeyItem, SheetCell, SheetPart } from '../../charts/RoundSheet.tsx';
import type { CodeSet } from '../../model/codeSet.ts';

/** The sign of each code by its label: kinds of off-task are numbered in the order of the set. */
export type CodeSigns = ReadonlyMap<string, CellMark>;

export function codeSigns(codeSet: CodeSet): CodeSigns {
  const signs = new Map<string, CellMark>();
  let nth = 0;
  for (const { label, role } of codeSet.codes) {
    if (role === 'off-task') nth += 1;
    signs.set(
      label,
      role === 'on-task' ? { kind: 'on' } : role === 'off-task' ? { kind: 'off', nth } : { kind: 'other' },
    );
  }
  return signs;
}

function marksOf(said: Said, signs: CodeSigns): CellMark[] {
  if (said.state === 'missing') return [{ kind: 'missing' }];
  if (said.state === 'counts') return [{ kind: 'other' }];
  return said.codes.map((code) => signs.get(code) ?? { kind: 'other' });
}

/** What one look of the sheet shows. */
function cellOf(cell: NonNullable<RoundSheet['rows'][number]['cells'][number]>, signs: CodeSigns): SheetCell {
  const base = { marks: marksOf(cell.mark, signs), late: cell.mark.late };
  return cell.second === null
    ? base
    : { ...base, second: marksOf(cell.second, signs), differs: cell.differs };
}

/** The sheets of all phases with the same children in the same rows. */
export function sheetParts(
  sheets: readonly RoundSheet[],
  signs: CodeSigns,
): { readonly rows: readonly string[]; readonly parts: readonly SheetPart[] } {
  const rows = [...new Set(sheets.flatMap((sheet) => sheet.rows.map(({ child }) => child ?? '')))];
  const parts = sheets.map((sheet) => ({
    name: sheet.phase ?? '',
    cells: rows.map((name) =>
      (sheet.rows.find(({ child }) => (child ?? '') === name)?.cells ?? []).flatMap((cell) =>
        cell === null ? [] : [cellOf(cell, signs)],
      ),
    ),
  }));
  return { rows, parts };
}

/** The key to the signs that a sheet uses, in the order of the code set. */
export function keyOf(
  parts: readonly SheetPart[],
  signs: CodeSigns,
  words: { readonly none: string; readonly missing: string; readonly late: string; readonly differs: string },
): KeyItem[] {
  const cells = parts.flatMap((part) => part.cells.flat());
  const marks = cells.flatMap((cell) => [...cell.marks, ...(cell.second ?? [])]);
  const nothing = cells.some((cell) => cell.marks.length === 0 || cell.second?.length === 0);
  return [
    ...[...signs].map(([label, sign]) => ({ sign, label })),
    ...(nothing ? [{ sign: { kind: 'none' as const }, label: words.none }] : []),
    ...(marks.some(({ kind }) => kind === 'missing')
      ? [{ sign: { kind: 'missing' as const }, label: words.missing }]
      : []),
    ...(cells.some(({ late }) => late === true) ? [{ sign: 'late' as const, label: words.late }] : []),
    ...(cells.some(({ differs }) => differs === true)
      ? [{ sign: 'differs' as const, label: words.differs }]
      : []),
  ];
}
