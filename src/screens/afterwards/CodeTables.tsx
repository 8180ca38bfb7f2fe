import type { PairDetails } from '../../analysis/index.ts';
import { Sheet } from '../../ui/Sheet.tsx';
import { Table } from '../../ui/Table.tsx';
import { say } from '../../words/say.ts';
import { useWords } from '../services.ts';

/** The table of codes of one phase, and each code against all others. */
export function CodeTables({
  pair: { row },
  alone,
}: {
  readonly pair: PairDetails;
  readonly alone: boolean;
}) {
  const words = useWords();
  const { codes, counts } = row.table;
  const [first, second] = row.observers;
  const phase = alone ? null : row.phase;
  if (row.compared === 0) return null;
  const percent = (value: number | null): string =>
    value === null ? words.agreement.notDefined : words.f.percentFine(value);
  return (
    <Sheet
      title={
        alone || row.phase === null
          ? words.agreement.tableTitle
          : `${words.agreement.tableTitle}, ${row.phase}`
      }
    >
      <div className="stack code-tables">
        {counts === null ? (
          <p className="second">
            {words.agreement.tableNone({
              reason: row.why.table === undefined ? '' : say(words.why, { code: row.why.table, values: {} }),
            })}
          </p>
        ) : (
          <Table
            caption={words.agreement.tableCaption({ phase, first, second })}
            rows={codes.map((code, k) => ({ code, counts: counts[k] ?? [] }))}
            rowKey={(line) => line.code}
            columns={[
              { key: 'code', head: first, rowHead: true, cell: (line) => line.code },
              ...codes.map((code, k) => ({
                key: code,
                head: code,
                number: true,
                cell: (line: { counts: readonly number[] }) => words.f.whole(line.counts[k] ?? 0),
              })),
            ]}
          />
        )}
        {row.codes.length > 0 && (
          <Table
            caption={words.agreement.codesCaption({ phase })}
            rows={row.codes}
            rowKey={(line) => line.code}
            columns={[
              { key: 'code', head: words.agreement.code, rowHead: true, cell: (line) => line.code },
              {
                key: 'kappa',
                head: words.agreement.kappa,
                number: true,
                cell: (line) =>
                  line.kappa === null ? words.agreement.notDefined : words.f.kappa(line.kappa),
              },
              {
                key: 'occurrence',
                head: words.agreement.occurrence,
                number: true,
                cell: (line) => percent(line.occurrence),
              },
              {
                key: 'non',
                head: words.agreement.nonOccurrence,
                number: true,
                cell: (line) => percent(line.nonOccurrence),
              },
            ]}
          />
        )}
      </div>
    </Sheet>
  );
}
