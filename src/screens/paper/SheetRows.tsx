import type { VisitPlan } from '../../model/visitPlan.ts';
import { useWords } from '../services.ts';
import { boxWidth, columnHead, type PaperItem, type PaperSheet, rowHeight, widths } from './paperLayout.ts';
import { boxNumbers, meaningText } from './paperTexts.ts';

interface Props {
  readonly plan: VisitPlan;
  readonly sheet: PaperSheet;
  readonly items: readonly PaperItem[];
}

/** One column of a page: one row an interval, a box for each code. */
export function SheetRows({ plan, sheet, items }: Props) {
  const words = useWords();
  const { paper } = words;
  const { protocol } = plan.schedule;
  const { method } = protocol;
  const heads =
    method === 'headcount'
      ? [paper.onTask, paper.present]
      : sheet.boxes
        ? boxNumbers(protocol).map(({ number, means }) =>
            paper.numbered({ number, text: meaningText(words, protocol, means) }),
          )
        : [paper.write];
  const wide = method === 'headcount' ? widths.count : sheet.boxes ? boxWidth : widths.write;
  const named = method !== 'headcount' && method !== 'duration';
  const pseudonyms = new Map(plan.children.map(({ id, pseudonym }) => [id, pseudonym]));
  const cannotSee = method !== 'headcount';
  const across = 2 + (named ? 1 : 0) + heads.length + (cannotSee ? 1 : 0) + 1;
  return (
    <table className="paper-rows" style={{ width: `${sheet.columnWidth}mm` }}>
      <colgroup>
        <col style={{ width: `${widths.number}mm` }} />
        <col style={{ width: `${method === 'duration' ? widths.onset : widths.time}mm` }} />
        {named && <col />}
        {heads.map((head) => (
          <col key={head} style={{ width: `${wide}mm` }} />
        ))}
        {cannotSee && <col style={{ width: `${boxWidth}mm` }} />}
        <col style={{ width: named ? `${widths.reason}mm` : 'auto' }} />
      </colgroup>
      <thead>
        <tr style={{ height: `${columnHead}mm` }}>
          <th>{method === 'duration' ? paper.line : paper.number}</th>
          <th>{method === 'duration' ? paper.onset : paper.time}</th>
          {named && <th className="paper-left">{paper.child}</th>}
          {heads.map((head) => (
            <Upright key={head}>{head}</Upright>
          ))}
          {cannotSee && <Upright>{paper.numbered({ number: 0, text: paper.cannotSee })}</Upright>}
          {named ? <Upright>{paper.reason}</Upright> : <th>{paper.reason}</th>}
        </tr>
      </thead>
      <tbody>
        {items.map((item) => {
          if (item.kind === 'part')
            return (
              <tr key={`part ${item.part}`} className="paper-part">
                <th colSpan={across} className="paper-clip">
                  {method === 'duration'
                    ? paper.partDuration({
                        phase: item.phase,
                        number: item.line.number,
                        child: pseudonyms.get(item.line.child ?? '') ?? '',
                        length: paper.clock({ ms: item.line.endMs }),
                        part: item.part,
                      })
                    : paper.part({ phase: item.phase, part: item.part })}
                </th>
              </tr>
            );
          const height = { height: `${rowHeight}mm` };
          const number = item.kind === 'row' ? item.line.number : item.number;
          return (
            <tr
              key={number}
              style={height}
              className={item.kind === 'row' && item.newRound ? 'paper-round' : ''}
            >
              <th data-interval={item.kind === 'row' ? number : undefined}>{number}</th>
              {item.kind === 'row' ? (
                <td className="paper-time">{paper.clock({ ms: item.line.cueMs })}</td>
              ) : (
                <td className="paper-colon">:</td>
              )}
              {named && item.kind === 'row' && (
                <td className="paper-left paper-clip">{pseudonyms.get(item.line.child ?? '') ?? ''}</td>
              )}
              {heads.map((head) => (
                <td key={head} className="paper-box">
                  <i />
                </td>
              ))}
              {cannotSee && (
                <td className="paper-box paper-see">
                  <i />
                </td>
              )}
              <td className="paper-box">
                <i />
              </td>
            </tr>
          );
        })}
      </tbody>
    </table>
  );
}

function Upright({ children }: { readonly children: string }) {
  return (
    <th className="paper-upright">
      <span>{children}</span>
    </th>
  );
}
