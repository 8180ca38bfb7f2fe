import type { Difference } from '../../analysis/index.ts';
import { Table } from '../../ui/Table.tsx';
import { useWords } from '../services.ts';

interface Props {
  readonly differences: readonly (Difference & { readonly phase: string | null })[];
  readonly observers: readonly [string, string];
}

/** Every look on which two observers differ, in the order of the session. */
export function Differences({ differences, observers }: Props) {
  const words = useWords();
  const said = ({ labels, counts }: Difference['a']): string => {
    if (counts !== null) return words.agreement.counts(counts);
    return labels === null || labels.length === 0 ? words.agreement.none : words.f.list(labels);
  };
  return (
    <Table
      caption={words.agreement.differencesCaption}
      captionHidden
      rows={differences}
      rowKey={(one) => `${one.phase} ${one.child} ${one.number}`}
      columns={[
        {
          key: 'interval',
          head: words.agreement.interval,
          number: true,
          cell: (one) => words.f.whole(one.number),
        },
        { key: 'child', head: words.agreement.child, rowHead: true, cell: (one) => one.child },
        { key: 'phase', head: words.agreement.phase, cell: (one) => one.phase },
        {
          key: 'at',
          head: words.agreement.at,
          number: true,
          cell: (one) => (one.at === null ? '' : words.f.clock(one.at)),
        },
        { key: 'a', head: observers[0], cell: (one) => said(one.a) },
        { key: 'b', head: observers[1], cell: (one) => said(one.b) },
      ]}
    />
  );
}
