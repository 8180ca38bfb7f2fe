import type { ClassChange } from '../../analysis/index.ts';
import { Table } from '../../ui/Table.tsx';
import { useWords } from '../services.ts';

/** Errors and the paired t of each class: for the analyst of a study, never on a page for one class. */
export function AnalystTable({ rows }: { readonly rows: readonly ClassChange[] }) {
  const words = useWords();
  const column = (field: 'sdChange' | 'standardError' | 't' | 'df', head: string, digits: number) => ({
    key: field,
    head,
    number: true,
    cell: (row: ClassChange) => {
      const value = row[field];
      return value === null ? words.change.notDefined : words.f.fixed(value, digits);
    },
  });
  return (
    <Table
      caption={words.change.analystCaption}
      rows={rows}
      rowKey={(row) => `${row.class} ${row.condition}`}
      columns={[
        {
          key: 'class',
          head: words.change.klass,
          rowHead: true,
          cell: (row) => row.class ?? words.change.withoutName,
        },
        column('sdChange', words.change.sd, 2),
        column('standardError', words.change.standardError, 2),
        column('t', words.change.t, 2),
        column('df', words.change.df, 0),
        {
          key: 'p',
          head: words.change.p,
          number: true,
          cell: (row) => (row.p === null ? words.change.notDefined : words.f.p(row.p)),
        },
      ]}
    />
  );
}
