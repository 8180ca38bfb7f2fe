import { memo, useMemo } from 'react';
import { useCoreWords } from '../coreServices.ts';
import { partLengths } from './amounts.ts';
import { useFacts } from './RoomFacts.tsx';
import { partStarts, ribbonSpans, type Span } from './ribbonSpans.ts';
import { useRoom } from './useRoom.ts';

/** A duration record: a stroke where something was in force, a tick at each onset, dots where nothing was, brass = now. */
export function TimeRibbon() {
  const words = useCoreWords();
  const { plan } = useFacts();
  const lengths = useMemo(() => partLengths(plan), [plan]);
  const starts = useMemo(() => partStarts(lengths), [lengths]);
  const total = Math.max(1, lengths.reduce((sum, ms) => sum + ms, 0) / 1000);
  const text = useRoom((s) => JSON.stringify(ribbonSpans(s.intervals, s.state.origins, starts).map(rounded)));
  const spans = useMemo(() => JSON.parse(text) as Span[], [text]);
  const ended = useRoom((s) => s.phase === 'ended');
  const now = spans.at(-1)?.to ?? 0;
  const missing = spans.reduce((sum, { from, to, scored }) => (scored ? sum : sum + to - from), 0);
  return (
    <div
      className="ribbon ribbon-time"
      role="img"
      aria-label={words.room.ribbonTime({
        now: Math.floor(now) * 1000,
        of: total * 1000,
        missing: Math.floor(missing) * 1000,
      })}
    >
      <Strokes spans={spans} starts={starts} total={total} />
      {!ended && <NowSign at={now / total} />}
    </div>
  );
}

/** To the second: finer steps cannot be seen, and would draw anew all the time. */
const rounded = ({ from, to, scored }: Span): Span => ({
  from: Math.floor(from),
  to: Math.floor(to),
  scored,
});

interface StrokesProps {
  readonly spans: readonly Span[];
  readonly starts: readonly number[];
  readonly total: number;
}

const Strokes = memo(function Strokes({ spans, starts, total }: StrokesProps) {
  const x = (seconds: number): string => ((seconds / total) * 1000).toFixed(1);
  const now = spans.at(-1)?.to ?? 0;
  let scored = '';
  let onsets = '';
  let missing = '';
  for (const span of spans) {
    if (span.scored) {
      scored += `M${x(span.from)} 24H${x(span.to)}`;
      onsets += `M${x(span.from)} 14V34`;
    } else missing += `M${x(span.from)} 24H${x(span.to)}`;
  }
  const parts = starts
    .slice(1)
    .map((start) => `M${x(start)} 6V42`)
    .join('');
  return (
    <svg className="ribbon-ticks" viewBox="0 0 1000 48" preserveAspectRatio="none" aria-hidden="true">
      <path className="ribbon-part" d={parts} />
      <path className="ribbon-waiting" d={`M${x(now)} 24H1000`} />
      <path className="ribbon-span-missing" d={missing} />
      <path className="ribbon-span" d={scored} />
      <path d={onsets} />
    </svg>
  );
});

/** The brass triangle: now. */
export function NowSign({ at }: { readonly at: number }) {
  return (
    <svg
      className="ribbon-now"
      style={{ left: `${at * 100}%` }}
      width="18"
      height="48"
      viewBox="0 0 18 48"
      aria-hidden="true"
    >
      <path d="M0 0H18L10.5 12V46H7.5V12Z" />
    </svg>
  );
}
