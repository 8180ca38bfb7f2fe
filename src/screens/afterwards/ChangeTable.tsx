import type { ClassChange } from '../../analysis/index.ts';
import { type Column, Table } from '../../ui/Table.tsx';
import { say } from '../../words/say.ts';
import { useWords } from '../services.ts';

interface Props {
  readonly rows: readonly ClassChange[];
  readonly before: string;
  readonly after: string;
  readonly linked?: boolean;
}

/** Means and change class by class; an undefined figure says why below. */
export function ChangeTable({ rows, before, after, linked = false }: Props) {
  const words = useWords();
  const several = new Set(rows.map(({ condition }) => condition)).size > 1;
  const nameOf = (row: ClassChange): string => row.class ?? words.change.withoutName;
  const fixed = (field: keyof ClassChange & string, digits: number) => (row: ClassChange) => {
    const value = row[field as 'sdChange'];
    return value === null ? words.change.notDefined : words.f.fixed(value, digits);
  };
  const percent = (value: number | null): string =>
    value === null ? words.change.notDefined : words.f.percentFine(value);
  const columns: Column<ClassChange>[] = [
    {
      key: 'class',
      head: words.change.klass,
      rowHead: true,
      cell: (row) =>
        linked && row.class !== null ? (
          <a className="row-link" href={`#/afterwards/change/${encodeURIComponent(row.class)}`}>
            {nameOf(row)}
          </a>
        ) : (
          nameOf(row)
        ),
    },
    ...(several
      ? [{ key: 'condition', head: words.change.condition, cell: (row: ClassChange) => row.condition }]
      : []),
    {
      key: 'children',
      head: words.change.children,
      number: true,
      cell: (row) => words.f.whole(row.children),
    },
    {
      key: 'before',
      head: words.change.meanBefore({ phase: before }),
      number: true,
      cell: (row) => percent(row.meanBefore),
    },
    {
      key: 'after',
      head: words.change.meanAfter({ phase: after }),
      number: true,
      cell: (row) => percent(row.meanAfter),
    },
    {
      key: 'change',
      head: words.change.changeColumn,
      number: true,
      cell: (row) => (row.change === null ? words.change.notDefined : words.f.points(row.change)),
    },
    {
      key: 'between',
      head: words.change.between,
      number: true,
      cell: ({ lower, upper }) =>
        lower === null || upper === null
          ? words.change.notDefined
          : words.change.betweenFigures({ lower, upper }),
    },
    { key: 'g', head: words.change.g, number: true, cell: fixed('g', 2) },
    { key: 'gVariance', head: words.change.gVariance, number: true, cell: fixed('gVariance', 3) },
  ];
  const shown = ['change', 'lower', 'g', 'gVariance'] as const;
  const reasons = rows.flatMap((row) => {
    const field = shown.find((one) => row.why[one] !== undefined);
    const code = field === undefined ? undefined : row.why[field];
    if (field === undefined || code === undefined) return [];
    const figure = field === 'lower' ? words.change.between : words.figures[field];
    const reason = say(words.why, { code, values: {} });
    return [words.change.because({ klass: nameOf(row), figure, reason })];
  });
  return (
    <>
      <Table
        caption={words.change.tableCaption}
        captionHidden
        rows={rows}
        rowKey={(row) => `${row.class} ${row.condition}`}
        columns={columns}
      />
      {reasons.map((reason) => (
        <p key={reason} className="second small">
          {reason}
        </p>
      ))}
    </>
  );
}
