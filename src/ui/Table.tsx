import type { ReactNode } from 'react';
import './table.css';

export interface Column<Row> {
  readonly key: string;
  readonly head: ReactNode;
  readonly cell: (row: Row) => ReactNode;
  /** Numbers stand to the right. */
  readonly number?: boolean;
  /** The row's own name: a row heading. */
  readonly rowHead?: boolean;
}

interface Props<Row> {
  /** What the table holds, for everybody; may be hidden where a heading says it. */
  readonly caption: ReactNode;
  readonly captionHidden?: boolean;
  readonly columns: readonly Column<Row>[];
  readonly rows: readonly Row[];
  readonly rowKey: (row: Row) => string;
}

/** A table of figures; it scrolls sideways by itself on narrow glass. */
export function Table<Row>({ caption, captionHidden = false, columns, rows, rowKey }: Props<Row>) {
  return (
    <section
      className="table-frame"
      aria-label={typeof caption === 'string' ? caption : undefined}
      // biome-ignore lint/a11y/noNoninteractiveTabindex: a region that scrolls must be reachable by keyboard
      tabIndex={0}
    >
      <table className="table">
        <caption className={captionHidden ? 'visually-hidden' : ''}>{caption}</caption>
        <thead>
          <tr>
            {columns.map((column) => (
              <th key={column.key} scope="col" className={column.number ? 'table-number' : ''}>
                {column.head}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => (
            <tr key={rowKey(row)}>
              {columns.map((column) =>
                column.rowHead ? (
                  <th key={column.key} scope="row">
                    {column.cell(row)}
                  </th>
                ) : (
                  <td key={column.key} className={column.number ? 'table-number' : ''}>
                    {column.cell(row)}
                  </td>
                ),
              )}
            </tr>
          ))}
        </tbody>
      </table>
    </section>
  );
}
