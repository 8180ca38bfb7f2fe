import { useMemo } from 'react';
import type { VisitPlan } from '../../model/visitPlan.ts';
import { sheetLabel } from '../../schedule/sheetLabel.ts';
import { useWords } from '../services.ts';
import {
  type LegendEntry,
  legendEntryHeight,
  type PaperPage,
  type PaperSheet,
  type PaperSize,
  papers,
} from './paperLayout.ts';
import { reasonsLine } from './paperTexts.ts';
import { SheetHead, SheetHeadAgain } from './SheetHead.tsx';
import { SheetRounds } from './SheetRounds.tsx';
import { SheetRows } from './SheetRows.tsx';
import './paperSheet.css';
import './paperPrint.css';

interface Props {
  readonly plan: VisitPlan;
  readonly size: PaperSize;
  readonly sheet: PaperSheet;
}

/** The sheets as they will come out of the printer. */
export function PaperPages({ plan, size, sheet }: Props) {
  const { paper } = useWords();
  const label = useMemo(() => sheetLabel(plan), [plan]);
  const { width, height } = papers[size];
  const of = sheet.pages.length;
  return (
    <ol className="paper-pages">
      {sheet.pages.map((page) => (
        <li key={page.number} className={`paper-page paper-${size}`}>
          <section
            aria-label={paper.preview({ page: page.number, of })}
            style={{ width: `${width}mm`, height: `${height}mm` }}
          >
            {page.first ? (
              <SheetHead {...{ plan, label, of }} page={page.number} sheet={sheet} />
            ) : (
              <SheetHeadAgain {...{ plan, label, of }} page={page.number} />
            )}
            <Content {...{ plan, sheet, page }} />
          </section>
        </li>
      ))}
    </ol>
  );
}

function Content({ plan, sheet, page }: Omit<Props, 'size'> & { readonly page: PaperPage }) {
  const { paper } = useWords();
  return (
    <>
      {page.legend.length > 0 && <Legend plan={plan} entries={page.legend} />}
      {page.first && sheet.legendPage > 1 && (
        <p className="paper-caution">{paper.legendLater({ page: sheet.legendPage })}</p>
      )}
      {page.columns.length > 0 && (
        <div className="paper-columns">
          {page.columns.map((items, k) => (
            // biome-ignore lint/suspicious/noArrayIndexKey: a column is its place on the page
            <SheetRows key={k} plan={plan} sheet={sheet} items={items} />
          ))}
        </div>
      )}
      {page.bands.map((band) => (
        <SheetRounds
          key={`${band.part} ${band.rounds[0]?.round}`}
          band={band}
          parts={plan.schedule.phases.length}
        />
      ))}
    </>
  );
}

function Legend({ plan, entries }: { readonly plan: VisitPlan; readonly entries: readonly LegendEntry[] }) {
  const words = useWords();
  return (
    <div className="paper-legend">
      <strong>{words.paper.legend}</strong>
      <dl>
        {entries.map((entry) => (
          <div key={entry.label} style={{ height: `${legendEntryHeight(entry)}mm` }}>
            <dt>
              <b>{entry.number}</b> {entry.label}
            </dt>
            <dd style={{ WebkitLineClamp: entry.lines }}>{entry.text}</dd>
          </div>
        ))}
      </dl>
      <p>{reasonsLine(words, plan.schedule.protocol)}</p>
    </div>
  );
}
