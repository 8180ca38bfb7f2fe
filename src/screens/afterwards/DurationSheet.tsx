import type { DurationAgreement, PairDetails } from '../../analysis/index.ts';
import { Figures } from '../../ui/Figures.tsx';
import { Sheet } from '../../ui/Sheet.tsx';
import { Table } from '../../ui/Table.tsx';
import { useWords } from '../services.ts';

/** Two duration records of one child: second by second, and in total. Nothing for other methods. */
export function DurationSheet({ pairs }: { readonly pairs: readonly PairDetails[] }) {
  const { agreement } = useWords();
  return pairs.map(({ key, durations, row }) =>
    durations === null ? null : (
      <Sheet key={key} title={agreement.durations({ phase: pairs.length === 1 ? null : row.phase })}>
        <OneChild durations={durations} observers={row.observers} />
      </Sheet>
    ),
  );
}

interface Props {
  readonly durations: DurationAgreement;
  readonly observers: readonly [string, string];
}

function OneChild({ durations, observers }: Props) {
  const { agreement, f } = useWords();
  const { compared, excluded, percentAgreement, kappa, codes } = durations;
  const orNot = (figure: string | null) =>
    figure ?? <span className="not-defined">{agreement.notDefined}</span>;
  const [a, b] = observers;
  return (
    <div className="stack-tight">
      <Figures
        items={[
          {
            name: agreement.secondBySecond,
            value: orNot(percentAgreement === null ? null : f.percentFine(percentAgreement)),
          },
          { name: agreement.kappa, value: orNot(kappa === null ? null : f.kappa(kappa)) },
        ]}
      />
      <p className="second small">{agreement.secondsCompared({ compared, excluded })}</p>
      <Table
        caption={agreement.totals}
        rows={codes}
        rowKey={({ code }) => code}
        columns={[
          { key: 'code', head: agreement.code, rowHead: true, cell: ({ code }) => code },
          { key: 'a', head: a, number: true, cell: (one) => f.clock(one.a * 1000) },
          { key: 'b', head: b, number: true, cell: (one) => f.clock(one.b * 1000) },
          {
            key: 'ratio',
            head: agreement.totalRatio,
            number: true,
            cell: ({ ratio }) => orNot(ratio === null ? null : f.percentFine(ratio)),
          },
        ]}
      />
      <p className="second small">{agreement.totalsFlatter}</p>
    </div>
  );
}
