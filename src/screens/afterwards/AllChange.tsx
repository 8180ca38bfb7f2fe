import { useState } from 'react';
import type { ChangeDetails } from '../../analysis/index.ts';
import { ChangeForest, type ForestGroup } from '../../charts/ChangeForest.tsx';
import { screenPalette } from '../../charts/palette.ts';
import { Check } from '../../ui/Choice.tsx';
import { PageHead } from '../../ui/PageHead.tsx';
import { Sheet } from '../../ui/Sheet.tsx';
import { say } from '../../words/say.ts';
import { useWords } from '../services.ts';
import { AnalystTable } from './AnalystTable.tsx';
import { ChangeTable } from './ChangeTable.tsx';
import { Chart } from './Chart.tsx';
import { PooledTable } from './PooledTable.tsx';
import { useChangeSentence } from './useChangeSentence.ts';
import { WarningLines } from './WarningLines.tsx';

/** The change of all classes: the sentence, each class as a square, the classes together, conditions compared. */
export function AllChange({ details }: { readonly details: ChangeDetails }) {
  const words = useWords();
  const [analyst, setAnalyst] = useState(false);
  const sentence = useChangeSentence(details).all;
  const { before, after, report } = details;
  const { comparison, why } = report;
  const groups = useForest(details);
  const known = groups.some((group) => group.rows.length > 0);
  return (
    <>
      <PageHead about={words.change.about({ klass: null, before, after })} note={sentence.note}>
        {sentence.title}
      </PageHead>
      <WarningLines remarks={[...details.problems, ...details.notices]} />
      {known && (
        <Sheet title={words.change.forest}>
          <Chart>
            {(width) => (
              <ChangeForest
                width={width}
                palette={screenPalette}
                label={words.change.forestLabel}
                groups={groups}
                axis={words.change.axis}
                tick={(points) => words.change.tick({ points })}
              />
            )}
          </Chart>
          {report.pooled.length > 0 && (
            <p className="second small">
              {words.change.pooledHow}{' '}
              {details.predictions
                .map(({ condition, lower, upper }) =>
                  lower === null || upper === null
                    ? words.change.predictionUnknown
                    : words.change.prediction({
                        condition: details.predictions.length > 1 ? condition : null,
                        lower,
                        upper,
                      }),
                )
                .filter((text, k, all) => all.indexOf(text) === k)
                .join(' ')}
            </p>
          )}
        </Sheet>
      )}
      {comparison !== null && comparison.difference !== null && (
        <Sheet title={words.change.comparisonTitle}>
          <p>
            {words.change.comparison({
              condition: comparison.condition,
              control: comparison.control,
              difference: comparison.difference,
              lower: comparison.lower,
              upper: comparison.upper,
              unit: comparison.unit,
            })}
          </p>
          {analyst && <p className="second">{words.change.comparisonAnalyst(comparison)}</p>}
        </Sheet>
      )}
      {report.classes.length > 0 && (
        <Sheet title={words.change.tableTitle}>
          <div className="stack-tight">
            <ChangeTable rows={report.classes} before={before} after={after} linked />
            {analyst && <AnalystTable rows={report.classes} />}
            {analyst && report.pooled.length > 0 && <PooledTable rows={report.pooled} />}
            <div className="not-in-print">
              <Check
                label={words.change.analyst}
                hint={words.change.analystHint}
                checked={analyst}
                onChange={setAnalyst}
              />
            </div>
          </div>
        </Sheet>
      )}
      <p className="second small how">
        {words.change.how({ before, after, ways: details.ways })}
        {comparison === null && why.comparison !== undefined && report.classes.length > 1
          ? ` ${words.change.notRandom({ reason: say(words.why, { code: why.comparison, values: {} }) })}`
          : ''}
      </p>
    </>
  );
}

/** Classes and pooled estimates of each condition as the forest shows them; classes without a change are left to the table. */
function useForest({ report, predictions }: ChangeDetails): ForestGroup[] {
  const words = useWords();
  const conditions = [...new Set(report.classes.map(({ condition }) => condition))];
  return conditions.map((condition) => {
    const pooled = report.pooled.find((one) => one.condition === condition);
    const prediction = predictions.find((one) => one.condition === condition);
    return {
      name: conditions.length > 1 ? condition : null,
      rows: report.classes.flatMap((row) =>
        row.condition !== condition || row.change === null
          ? []
          : [
              {
                label: row.class ?? words.change.withoutName,
                estimate: row.change,
                lower: row.lower,
                upper: row.upper,
                figures: words.change.forestFigures({
                  change: row.change,
                  lower: row.lower,
                  upper: row.upper,
                }),
              },
            ],
      ),
      pooled:
        pooled === undefined || pooled.change === null
          ? null
          : {
              label: words.change.together({ classes: pooled.classes }),
              estimate: pooled.change,
              lower: pooled.lower,
              upper: pooled.upper,
              figures: words.change.forestFigures({
                change: pooled.change,
                lower: pooled.lower,
                upper: pooled.upper,
              }),
              predictionLower: prediction?.lower ?? null,
              predictionUpper: prediction?.upper ?? null,
            },
    };
  });
}
