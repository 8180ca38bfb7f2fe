import type { ChildLine } from '../../analysis/index.ts';
import { Table } from '../../ui/Table.tsx';
import { useWords } from '../services.ts';

interface Props {
  readonly lines: readonly ChildLine[];
  readonly before: string;
  readonly after: string;
}

/** The lines of the picture as a table: no child's change, nothing to rank by. */
export function ChildTable({ lines, before, after }: Props) {
  const words = useWords();
  const percent = (value: number | null): string => (value === null ? '' : words.f.percentFine(value));
  return (
    <Table
      caption={words.change.linesCaption}
      rows={lines}
      rowKey={(line) => line.child}
      columns={[
        { key: 'child', head: words.change.child, rowHead: true, cell: (line) => line.child },
        { key: 'before', head: before, number: true, cell: (line) => percent(line.before) },
        {
          key: 'looksBefore',
          head: words.change.looks({ phase: before }),
          number: true,
          cell: (line) => words.f.whole(line.looksBefore),
        },
        { key: 'after', head: after, number: true, cell: (line) => percent(line.after) },
        {
          key: 'looksAfter',
          head: words.change.looks({ phase: after }),
          number: true,
          cell: (line) => words.f.whole(line.looksAfter),
        },
      ]}
    />
  );
}
