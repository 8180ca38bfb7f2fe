import { Fragment } from 'react';
import type { ChangeDetails, ClassChangeDetails } from '../../analysis/index.ts';
import { ChildLines } from '../../charts/ChildLines.tsx';
import { screenPalette } from '../../charts/palette.ts';
import { PageHead } from '../../ui/PageHead.tsx';
import { Sheet } from '../../ui/Sheet.tsx';
import { useWords } from '../services.ts';
import { ChangeTable } from './ChangeTable.tsx';
import { Chart } from './Chart.tsx';
import { ChildTable } from './ChildTable.tsx';
import { useChangeSentence } from './useChangeSentence.ts';
import { WarningLines } from './WarningLines.tsx';

interface Props {
  readonly details: ChangeDetails;
  /** The class's row; several where it was seen under several conditions. */
  readonly own: readonly ClassChangeDetails[];
}

/** One class: it describes, and says nothing about any one child. */
export function ClassChangeView({ details, own }: Props) {
  const words = useWords();
  const sentence = useChangeSentence(details);
  const { before, after } = details;
  const [first] = own;
  if (first === undefined) return null;
  const klass = first.row.class ?? words.change.withoutName;
  const { title, note } = sentence.of(first);
  const remarks = [...details.problems, ...details.notices].filter(
    ({ values }) => values.class === undefined || values.class === first.row.class,
  );
  return (
    <>
      <PageHead about={words.change.about({ klass, before, after })} note={note}>
        {title}
      </PageHead>
      <WarningLines remarks={remarks} />
      {own.map((one) => (
        <Fragment key={one.row.condition ?? ''}>
          {one !== first && <p>{sentence.of(one).title}</p>}
          <Sheet title={words.change.eachChild({ klass })}>
            <Lines one={one} before={before} after={after} />
          </Sheet>
        </Fragment>
      ))}
      <Sheet title={words.change.tableTitle}>
        <ChangeTable rows={own.map(({ row }) => row)} before={before} after={after} />
      </Sheet>
      <p className="second small how">{words.change.how({ before, after, ways: details.ways })}</p>
    </>
  );
}

function Lines({
  one: { row, lines },
  before,
  after,
}: {
  readonly one: ClassChangeDetails;
  readonly before: string;
  readonly after: string;
}) {
  const words = useWords();
  const klass = row.class ?? words.change.withoutName;
  const both = lines.flatMap((line) =>
    line.before === null || line.after === null
      ? []
      : [{ child: line.child, before: line.before, after: line.after }],
  );
  const mean =
    row.meanBefore === null || row.meanAfter === null
      ? null
      : { before: row.meanBefore, after: row.meanAfter };
  if (both.length === 0 && mean === null) return <p className="second">{words.change.noLines}</p>;
  const leftOut = words.change.leftOut({ n: lines.length - both.length });
  return (
    <div className="columns">
      <Chart>
        {(width) => (
          <ChildLines
            width={Math.min(width, 620)}
            palette={screenPalette}
            label={words.change.linesLabel({ klass, before, after })}
            before={before}
            after={after}
            lines={both}
            mean={mean}
            meanLabels={{
              before: mean === null ? '' : words.change.percent({ percent: mean.before }),
              after: mean === null ? '' : words.change.percent({ percent: mean.after }),
              name: words.change.mean,
            }}
          />
        )}
      </Chart>
      <div className="stack-tight">
        <ChildTable lines={lines} before={before} after={after} />
        {leftOut !== '' && <p className="second small">{leftOut}</p>}
      </div>
    </div>
  );
}
