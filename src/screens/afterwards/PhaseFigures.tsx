import type { PhaseDetails, Share, Why } from '../../analysis/index.ts';
import { Composition } from '../../charts/Composition.tsx';
import { screenPalette } from '../../charts/palette.ts';
import { Sheet } from '../../ui/Sheet.tsx';
import { Table } from '../../ui/Table.tsx';
import { say } from '../../words/say.ts';
import { useWords } from '../services.ts';
import { Chart } from './Chart.tsx';
import { WarningLines } from './WarningLines.tsx';

type Shown = Pick<Share, 'scored' | 'missing' | 'percentOnTask' | 'lower' | 'upper'> & { readonly why: Why };

/** The figures of one phase: child by child, part by part, and what off-task was made of. */
export function PhaseFigures({ phase, alone }: { readonly phase: PhaseDetails; readonly alone: boolean }) {
  const words = useWords();
  const { row, children, lessonParts, offTask } = phase;
  const why = (figures: Shown): string =>
    figures.why.percentOnTask === undefined
      ? words.afterwards.undefinedHere
      : say(words.why, { code: figures.why.percentOnTask, values: {} });
  const continuous = row.method === 'duration';
  const size = (value: number | null): string =>
    value === null ? '' : continuous ? words.f.clock(value * 1000) : words.f.whole(value);
  const shares = [
    {
      key: 'scored',
      head: continuous ? words.afterwards.watchedIn({ phase: null }) : words.afterwards.scored,
      number: true,
      cell: (one: Shown) => size(one.scored),
    },
    {
      key: 'missing',
      head: continuous ? words.afterwards.timeMissingIn({ phase: null }) : words.afterwards.missing,
      number: true,
      cell: (one: Shown) => size(one.missing),
    },
    {
      key: 'percent',
      head: words.afterwards.percentOnTask,
      number: true,
      cell: (one: Shown) =>
        one.percentOnTask === null ? (
          <span className="second">{why(one)}</span>
        ) : (
          words.f.percentFine(one.percentOnTask)
        ),
    },
    {
      key: 'between',
      head: words.afterwards.between,
      number: true,
      cell: (one: Shown) =>
        one.lower === null || one.upper === null
          ? ''
          : words.afterwards.betweenFigures({ lower: one.lower, upper: one.upper }),
    },
  ];
  const parts = lessonParts.filter(({ lessonPart }) => lessonPart !== null);
  const off = offTask.reduce((sum, { n }) => sum + n, 0);
  return (
    <Sheet {...(!alone && row.phase !== null && { title: row.phase })} className="phase">
      <WarningLines warnings={phase.warnings} continuous={continuous} />
      {children.length > 0 && (
        <section className="stack-tight">
          <h3>{words.afterwards.perChild({ phase: null })}</h3>
          <Table
            caption={words.afterwards.perChild({ phase: row.phase })}
            captionHidden
            rows={children}
            rowKey={(child) => child.id}
            columns={[
              {
                key: 'child',
                head: words.afterwards.child,
                rowHead: true,
                cell: (child) => (
                  <>
                    <span className="name">{child.child}</span>
                    {child.warnings.map((one) => (
                      <span key={one.code} className="beside">
                        {say(words.warnings, one)}
                      </span>
                    ))}
                  </>
                ),
              },
              ...shares,
              ...(row.method === 'momentary'
                ? [
                    {
                      key: 'worth',
                      head: words.afterwards.worth,
                      number: true,
                      cell: (child: (typeof children)[number]) =>
                        child.effectiveLooks === null ? '' : words.f.decimal(child.effectiveLooks),
                    },
                  ]
                : []),
            ]}
          />
          {row.classPercent !== null && children.length > 1 && (
            <p className="second small">
              {words.afterwards.classMean({ percent: row.classPercent })}
              {row.method === 'momentary' ? ` ${words.afterwards.worthHint}` : ''}
            </p>
          )}
        </section>
      )}
      {/* Of a duration the stretches are counted, which says nothing of how long they were. */}
      {offTask.length > 1 && !continuous && row.method !== 'headcount' && (
        <section className="stack-tight">
          <h3>{words.afterwards.makeUp({ phase: null })}</h3>
          {off === 0 ? (
            <p className="second">{words.afterwards.makeUpNone}</p>
          ) : (
            <Chart>
              {(width) => (
                <Composition
                  width={width}
                  palette={screenPalette}
                  label={words.afterwards.makeUp({ phase: row.phase })}
                  shares={offTask.map(({ code, n }) => ({
                    label: words.afterwards.makeUpShare({ code, count: n, of: off }),
                    size: n,
                  }))}
                />
              )}
            </Chart>
          )}
        </section>
      )}
      {parts.length > 0 && (
        <section className="stack-tight">
          <h3>{words.afterwards.perPart({ phase: null })}</h3>
          <Table
            caption={words.afterwards.perPart({ phase: row.phase })}
            captionHidden
            rows={lessonParts}
            rowKey={(part) => part.lessonPart ?? ''}
            columns={[
              {
                key: 'part',
                head: words.afterwards.lessonPart,
                rowHead: true,
                cell: (part) => part.lessonPart ?? words.afterwards.noPart,
              },
              ...shares,
            ]}
          />
        </section>
      )}
    </Sheet>
  );
}
