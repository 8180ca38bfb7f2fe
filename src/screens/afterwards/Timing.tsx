import type { SessionDetails, TimingFacts } from '../../analysis/index.ts';
import type { GapCause } from '../../journal/entry.ts';
import { Sheet } from '../../ui/Sheet.tsx';
import { say } from '../../words/say.ts';
import { useWords } from '../services.ts';
import { TimingSign } from './TimingSign.tsx';

interface Props {
  readonly details: SessionDetails;
  readonly fromPaper: boolean;
}

/** Whether the prompts kept their schedule: one word, what stands against it, and the figures behind it. */
export function Timing({ details: { timing }, fromPaper }: Props) {
  const words = useWords();
  const { afterwards } = words;
  if (fromPaper || timing === null || timing.verdict === null) {
    return (
      <Sheet title={afterwards.timing} className="not-in-print">
        <p className="second">{fromPaper ? words.paper.timing : afterwards.timingUnknown}</p>
      </Sheet>
    );
  }
  const { word, reasons } = timing.verdict;
  return (
    <Sheet title={afterwards.timing} className="not-in-print">
      <div className="stack-tight">
        <p className="verdict">
          <TimingSign word={word} /> <strong>{afterwards.timingWord({ word })}</strong>
        </p>
        {reasons.length === 0 ? (
          <p>{afterwards.timingReliable}</p>
        ) : (
          <ul className="stack-tight">
            {reasons.map((reason) => (
              <li key={reason.code}>{say(afterwards, reason)}</li>
            ))}
          </ul>
        )}
        <Details timing={timing} />
      </div>
    </Sheet>
  );
}

function Details({ timing }: { readonly timing: TimingFacts }) {
  const { afterwards: words } = useWords();
  const causes: Record<GapCause, string> = {
    closed: words.gapClosed,
    hidden: words.gapHidden,
    asleep: words.gapAsleep,
    sound: words.gapSound,
    clock: words.gapClock,
  };
  const { largestDeviationMs: largest, medianDeviationMs: median, responses, gaps, nudgeMs } = timing;
  const deviation =
    largest === null
      ? null
      : `${words.timingLargest({ ms: largest })}${median === null ? '.' : words.timingMedian({ ms: median })}`;
  return (
    <ul className="second small stack-tight">
      <li>
        {words.timingCarriers({
          heard: timing.bySound,
          shown: timing.byScreenOnly,
          failed: timing.failedCues,
        })}
      </li>
      {deviation !== null && <li>{deviation}</li>}
      {responses !== null && <li>{words.timingResponses(responses)}</li>}
      <li>{words.timingLate({ late: timing.late })}</li>
      {gaps.length === 0 && <li>{words.timingNoGaps}</li>}
      {gaps.map(({ from, to, wall, cause, estimated }) => (
        <li key={`${wall} ${cause} ${from}`}>
          {words.timingGap({ wall, seconds: (to - from) / 1000, cause: causes[cause], estimated })}
        </li>
      ))}
      {nudgeMs !== 0 && <li>{words.timingNudge({ ms: nudgeMs })}</li>}
    </ul>
  );
}
