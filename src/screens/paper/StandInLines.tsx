import type { VisitPlan } from '../../model/visitPlan.ts';
import { awayReasons } from '../../tasks/index.ts';
import { useWords } from '../services.ts';
import { awayNumber } from './paperTexts.ts';

interface Props {
  readonly plan: VisitPlan;
  /** How many absences can be written down. */
  readonly lines: number;
  /** In millimetres: of the sentences over them, and of all of it. */
  readonly text: number;
  readonly height: number;
}

/** Where an observer writes which reserve stepped in for whom, and from which interval on. */
export function StandInLines({ plan, lines, text, height }: Props) {
  const { paper, missing } = useWords();
  const { protocol } = plan.schedule;
  const reasons = awayReasons.map((reason) =>
    paper.numbered({ number: awayNumber(protocol, reason), text: missing[reason] }),
  );
  const heads = [
    paper.standInChild,
    paper.standInReasonNo,
    paper.standInFrom,
    paper.standInBy,
    paper.standInUntil,
  ];
  return (
    <div className="paper-stand-ins" style={{ height: `${height}mm` }}>
      <p style={{ height: `${text}mm` }}>
        <strong>{paper.standInHow}</strong>{' '}
        {paper.standInReserves({
          reserves: (plan.reserves ?? []).map(({ pseudonym }) => pseudonym),
          reasons,
        })}
      </p>
      <table>
        <thead>
          <tr>
            {heads.map((head) => (
              <th key={head} className="paper-clip">
                {head}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {Array.from({ length: lines }, (_, line) => (
            // biome-ignore lint/suspicious/noArrayIndexKey: empty lines have nothing but their place
            <tr key={line}>
              {heads.map((head) => (
                <td key={head} />
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}
