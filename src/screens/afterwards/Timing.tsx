import type { SessionDetails } from '../../analysis/index.ts';
import type { GapCause } from '../../journal/entry.ts';
import { Sheet } from '../../ui/Sheet.tsx';
import { useWords } from '../services.ts';

interface Props {
  readonly details: SessionDetails;
  readonly fromPaper: boolean;
}

/** How well the prompts kept their schedule, and when the tablet stood still. */
export function Timing({ details: { timing }, fromPaper }: Props) {
  const words = useWords();
  const causes: Record<GapCause, string> = {
    closed: words.afterwards.gapClosed,
    hidden: words.afterwards.gapHidden,
    asleep: words.afterwards.gapAsleep,
    sound: words.afterwards.gapSound,
    clock: words.afterwards.gapClock,
  };
  const largest = timing?.largestDeviationMs ?? null;
  const median = timing?.medianDeviationMs ?? null;
  return (
    <Sheet title={words.afterwards.timing} className="not-in-print">
      {timing === null || largest === null ? (
        <p className="second">{fromPaper ? words.paper.timing : words.afterwards.timingUnknown}</p>
      ) : (
        <ul className="stack-tight">
          <li>
            {words.afterwards.timingLargest({ ms: largest })}
            {median === null ? '.' : words.afterwards.timingMedian({ ms: median })}
          </li>
          {timing.failedCues > 0 && <li>{words.afterwards.timingFailed({ failed: timing.failedCues })}</li>}
          {timing.gaps.length === 0 && <li>{words.afterwards.timingNoGaps}</li>}
          {timing.gaps.map((gap) => (
            <li key={`${gap.from} ${gap.to}`}>
              {words.afterwards.timingGap({
                from: gap.from,
                seconds: (gap.to - gap.from) / 1000,
                cause: causes[gap.cause],
                estimated: gap.estimated,
              })}
            </li>
          ))}
        </ul>
      )}
    </Sheet>
  );
}
