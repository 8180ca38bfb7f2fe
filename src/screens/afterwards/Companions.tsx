import type { PairDetails } from '../../analysis/index.ts';
import { Figures } from '../../ui/Figures.tsx';
import { Table } from '../../ui/Table.tsx';
import { say } from '../../words/say.ts';
import { useWords } from '../services.ts';

/** The figures beside the sentence, phase by phase; an undefined one says why. */
export function Companions({ pairs }: { readonly pairs: readonly PairDetails[] }) {
  const words = useWords();
  const shown = [
    { field: 'percentAgreement', name: words.agreement.intervalByInterval, format: words.f.percentFine },
    { field: 'occurrence', name: words.agreement.onTaskAgreed, format: words.f.percentFine },
    { field: 'nonOccurrence', name: words.agreement.offTaskAgreed, format: words.f.percentFine },
    { field: 'kappa', name: words.agreement.kappa, format: words.f.kappa },
    { field: 'maximumKappa', name: words.agreement.highestKappa, format: words.f.kappa },
    { field: 'ac1', name: words.agreement.ac1, format: words.f.kappa },
  ] as const;
  const value = ({ row }: PairDetails, { field, format }: (typeof shown)[number]) => {
    const figure = row[field];
    if (figure !== null) return format(figure);
    return <span className="not-defined">{words.agreement.notDefined}</span>;
  };
  const [only] = pairs;
  const reasons = pairs.flatMap(({ row }) =>
    shown.flatMap(({ field, name }) => {
      const code = row.why[field];
      if (code === undefined) return [];
      const figure = pairs.length > 1 && row.phase !== null ? `${name}, ${row.phase}` : name;
      return [words.agreement.because({ figure, reason: say(words.why, { code, values: {} }) })];
    }),
  );
  return (
    <section className="stack-tight" aria-label={words.agreement.figuresOf({ phase: null })}>
      {pairs.length === 1 && only !== undefined ? (
        <Figures items={shown.map((one) => ({ name: one.name, value: value(only, one) }))} />
      ) : (
        <Table
          caption={words.agreement.figuresCaption}
          captionHidden
          rows={pairs}
          rowKey={(pair) => pair.key}
          columns={[
            { key: 'phase', head: words.agreement.phase, rowHead: true, cell: (pair) => pair.row.phase },
            ...shown.map((one) => ({
              key: one.field,
              head: one.name,
              number: true,
              cell: (pair: PairDetails) => <span className="big">{value(pair, one)}</span>,
            })),
          ]}
        />
      )}
      {reasons.length > 0 && <p className="second small">{reasons.join(' ')}</p>}
    </section>
  );
}
