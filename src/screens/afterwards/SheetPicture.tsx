import type { RoundSheet as Sheets } from '../../analysis/index.ts';
import { screenPalette } from '../../charts/palette.ts';
import { RoundSheet } from '../../charts/RoundSheet.tsx';
import type { CodeSet } from '../../model/codeSet.ts';
import { Table } from '../../ui/Table.tsx';
import { useWords } from '../services.ts';
import { Chart } from './Chart.tsx';
import { codeSigns, keyOf, sheetParts } from './chartMarks.ts';
import { useCellText } from './useCellText.ts';

interface Props {
  readonly sheets: readonly Sheets[];
  readonly codeSet: CodeSet;
  readonly klass: string;
  /** One observer, or two: then cells are split where they differ. */
  readonly observers: readonly string[];
}

/** The round sheet as a picture, and the same as a table for whoever cannot see it. */
export function SheetPicture({ sheets, codeSet, klass, observers }: Props) {
  const words = useWords();
  const cellText = useCellText();
  const signs = codeSigns(codeSet);
  const { rows, parts } = sheetParts(sheets, signs);
  const [first = '', second = ''] = observers;
  const two = observers.length > 1;
  const legend = keyOf(parts, signs, {
    none: words.afterwards.keyNone,
    missing: two ? words.agreement.keyMissing : words.afterwards.keyMissing,
    late: words.afterwards.keyLate,
    differs: words.agreement.keyDiffers({ first, second }),
  });
  const lines = sheets.flatMap((sheet) =>
    sheet.rows.map((row) => ({ phase: sheet.phase, child: row.child ?? '', cells: row.cells })),
  );
  const columns = sheets.reduce((most, sheet) => Math.max(most, sheet.columns), 0);
  return (
    <>
      <Chart>
        {(width) => (
          <RoundSheet
            width={width}
            palette={screenPalette}
            label={words.afterwards.sheetLabel({ klass, observers })}
            rows={rows}
            parts={parts}
            legend={legend}
          />
        )}
      </Chart>
      <details className="not-in-print">
        <summary>{words.afterwards.sheetTable}</summary>
        <Table
          caption={words.afterwards.sheetCaption}
          captionHidden
          rows={lines}
          rowKey={(line) => `${line.phase} ${line.child}`}
          columns={[
            {
              key: 'child',
              head: words.afterwards.phaseChild,
              rowHead: true,
              cell: (line) => [line.child, line.phase].filter((s) => s !== null && s !== '').join(', '),
            },
            ...Array.from({ length: columns }, (_, k) => ({
              key: String(k),
              head: words.f.whole(k + 1),
              cell: (line: (typeof lines)[number]) => {
                const cell = line.cells[k] ?? null;
                if (cell === null) return '';
                const own = cellText(cell.mark);
                return cell.second === null
                  ? own
                  : words.afterwards.cellOfTwo({ first: own, second: cellText(cell.second) });
              },
            })),
          ]}
        />
      </details>
    </>
  );
}
