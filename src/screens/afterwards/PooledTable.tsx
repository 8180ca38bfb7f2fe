import type { PooledChange } from '../../analysis/index.ts';
import { Table } from '../../ui/Table.tsx';
import { useWords } from '../services.ts';

/** The pooled estimates with their errors and how far the classes differ: for the analyst. */
export function PooledTable({ rows }: { readonly rows: readonly PooledChange[] }) {
  const words = useWords();
  const number = (value: number | null, digits: number): string =>
    value === null ? words.change.notDefined : words.f.fixed(value, digits);
  return (
    <Table
      caption={words.change.pooledCaption}
      rows={rows}
      rowKey={(row) => row.condition ?? ''}
      columns={[
        {
          key: 'condition',
          head: words.change.condition,
          rowHead: true,
          cell: (row) => row.condition ?? words.change.allClasses,
        },
        {
          key: 'classes',
          head: words.change.classes,
          number: true,
          cell: (row) => words.f.whole(row.classes),
        },
        {
          key: 'change',
          head: words.change.changeColumn,
          number: true,
          cell: (row) => (row.change === null ? words.change.notDefined : words.f.points(row.change)),
        },
        {
          key: 'error',
          head: words.change.standardError,
          number: true,
          cell: (row) => number(row.standardError, 2),
        },
        {
          key: 'between',
          head: words.change.between,
          number: true,
          cell: ({ lower, upper }) =>
            lower === null || upper === null ? '' : words.change.betweenFigures({ lower, upper }),
        },
        { key: 'tau2', head: words.change.tau2, number: true, cell: (row) => number(row.tau2, 2) },
        {
          key: 'i2',
          head: words.change.i2,
          number: true,
          cell: (row) => (row.i2 === null ? words.change.notDefined : words.f.percentFine(row.i2)),
        },
      ]}
    />
  );
}
