import type { SessionDetails } from '../../analysis/index.ts';
import type { Method } from '../../model/protocol.ts';
import { Sheet } from '../../ui/Sheet.tsx';
import { Table } from '../../ui/Table.tsx';
import { useWords } from '../services.ts';

type Counted = Pick<SessionDetails['phases'][number]['children'][number], 'scored' | 'missing' | 'missingBy'>;

/** What was recorded and what is missing, child by child; nothing of what the children did. */
export function Completeness({
  details,
  method,
  timed,
}: {
  readonly details: SessionDetails;
  readonly method: Method;
  /** Whether anybody knows when a mark was made: a sheet on paper does not say. */
  readonly timed: boolean;
}) {
  const words = useWords();
  const { afterwards } = words;
  const heads =
    method === 'headcount'
      ? [afterwards.countedIn, afterwards.scansMissingIn]
      : method === 'duration'
        ? [afterwards.watchedIn, afterwards.timeMissingIn]
        : [afterwards.scoredIn, afterwards.missingIn];
  const names = [
    ...new Set(
      details.phases.flatMap(({ children }) =>
        children.length === 0 ? [words.afterwards.wholeClass] : children.map(({ child }) => child),
      ),
    ),
  ];
  // One entry a phase; null where the child had no look in it.
  const lines = names.map((who) => ({
    who,
    of: details.phases.map(({ children, row, missingBy }): Counted | null => {
      if (children.length === 0) return { scored: row.scored, missing: row.missing, missingBy };
      return children.find(({ child }) => child === who) ?? null;
    }),
  }));
  const count = (value: number | null | undefined): string =>
    value === null || value === undefined
      ? ''
      : method === 'duration'
        ? words.f.clock(value * 1000)
        : words.f.whole(value);
  return (
    <Sheet title={words.afterwards.completeness}>
      <div className="stack-tight">
        {timed && method !== 'duration' && <p>{words.afterwards.lateMarks({ late: details.late })}</p>}
        <Table
          caption={words.afterwards.completeness}
          captionHidden
          rows={lines}
          rowKey={(line) => line.who}
          columns={[
            {
              key: 'who',
              head: words.afterwards.child,
              rowHead: true,
              cell: (line) => <span className="name">{line.who}</span>,
            },
            ...details.phases.flatMap(({ row: { phase } }, k) => [
              {
                key: `scored ${k}`,
                head: heads[0]?.({ phase }),
                number: true,
                cell: (line: (typeof lines)[number]) => count(line.of[k]?.scored),
              },
              {
                key: `missing ${k}`,
                head: heads[1]?.({ phase }),
                number: true,
                cell: (line: (typeof lines)[number]) => count(line.of[k]?.missing),
              },
            ]),
            {
              key: 'why',
              head: words.afterwards.why,
              cell: (line) =>
                line.of
                  .map((one) =>
                    method === 'duration'
                      ? (one?.missingBy ?? []).map(({ reason }) => words.missing[reason]).join(', ')
                      : words.afterwards.reasonsShort({
                          reasons: (one?.missingBy ?? []).map(({ reason, n }) => ({
                            reason: words.missing[reason],
                            n,
                          })),
                        }),
                  )
                  .filter((text) => text !== '')
                  .join('; '),
            },
          ]}
        />
      </div>
    </Sheet>
  );
}
