import type { SessionDetails } from '../../analysis/index.ts';
import { Sheet } from '../../ui/Sheet.tsx';
import { Table } from '../../ui/Table.tsx';
import { useWords } from '../services.ts';

/** What was recorded and what is missing, child by child; nothing of what the children did. */
export function Completeness({ details }: { readonly details: SessionDetails }) {
  const words = useWords();
  const lines = details.phases.flatMap(({ row, children, missingBy }) =>
    children.length === 0
      ? [
          {
            key: `${row.phase}`,
            who: words.afterwards.wholeClass,
            phase: row.phase,
            scored: row.scored,
            missing: row.missing,
            missingBy,
          },
        ]
      : children.map((child) => ({
          key: `${row.phase} ${child.id}`,
          who: child.child,
          phase: row.phase,
          scored: child.scored,
          missing: child.missing,
          missingBy: child.missingBy,
        })),
  );
  return (
    <Sheet title={words.afterwards.completeness}>
      <div className="stack-tight">
        <p>{words.afterwards.lateMarks({ late: details.late })}</p>
        <Table
          caption={words.afterwards.completeness}
          captionHidden
          rows={lines}
          rowKey={(line) => line.key}
          columns={[
            { key: 'who', head: words.afterwards.child, rowHead: true, cell: (line) => line.who },
            { key: 'phase', head: words.agreement.phase, cell: (line) => line.phase },
            {
              key: 'scored',
              head: words.afterwards.scored,
              number: true,
              cell: (line) => (line.scored === null ? '' : words.f.whole(line.scored)),
            },
            {
              key: 'missing',
              head: words.afterwards.missing,
              number: true,
              cell: (line) => (line.missing === null ? '' : words.f.whole(line.missing)),
            },
            {
              key: 'why',
              head: words.afterwards.why,
              cell: (line) =>
                words.afterwards.reasonsShort({
                  reasons: line.missingBy.map(({ reason, n }) => ({ reason: words.missing[reason], n })),
                }),
            },
          ]}
        />
      </div>
    </Sheet>
  );
}
