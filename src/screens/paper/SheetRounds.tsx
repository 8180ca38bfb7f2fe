import { useWords } from '../services.ts';
import { type Band, cell, childWidth, roundHead } from './paperLayout.ts';

/** Some rounds: one row a child, one column a round, a box to write a number in. */
export function SheetRounds({ band, parts }: { readonly band: Band; readonly parts: number }) {
  const { paper } = useWords();
  return (
    <table className="paper-rounds" style={{ width: `${childWidth + band.rounds.length * cell.width}mm` }}>
      <colgroup>
        <col style={{ width: `${childWidth}mm` }} />
        {band.rounds.map(({ round }) => (
          <col key={round} style={{ width: `${cell.width}mm` }} />
        ))}
      </colgroup>
      <thead>
        <tr style={{ height: `${roundHead}mm` }}>
          <th className="paper-left">{parts > 1 ? paper.roundsOf(band) : paper.child}</th>
          {band.rounds.map(({ round }) => (
            <th key={round}>{paper.round({ round })}</th>
          ))}
        </tr>
      </thead>
      <tbody>
        {band.rows.map(({ child, cells }) => (
          <tr key={child} style={{ height: `${cell.height}mm` }}>
            <th className="paper-left paper-clip">{child}</th>
            {cells.map((line, k) => (
              <td key={band.rounds[k]?.round} className={line === null ? 'paper-no-cell' : 'paper-cell'}>
                {line !== null && (
                  <>
                    <small>
                      <b data-interval={line.number}>{line.number}</b> {paper.clock({ ms: line.cueMs })}
                    </small>
                    <i />
                  </>
                )}
              </td>
            ))}
          </tr>
        ))}
      </tbody>
    </table>
  );
}
