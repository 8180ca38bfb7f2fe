import { type CSSProperties, memo } from 'react';
import { useCoreWords } from '../coreServices.ts';
import { useFacts } from './RoomFacts.tsx';
import { ribbonText } from './ribbonText.ts';
import { NowSign, TimeRibbon } from './TimeRibbon.tsx';
import { useRoom } from './useRoom.ts';
import './ribbon.css';

/** The whole session: ticks of intervals, or strokes of time. */
export function Ribbon() {
  return useFacts().unit === 'time' ? <TimeRibbon /> : <TickRibbon />;
}

/** A tick an interval, ring = missing, dot above = late, brass = now, a thin line between parts. */
function TickRibbon() {
  const words = useCoreWords();
  const { sweep } = useFacts();
  const text = useRoom((s) => ribbonText(s.intervals, sweep !== null));
  // Before the first cue the triangle stands just before the look that is coming.
  const now = useRoom((s) =>
    s.phase === 'ended'
      ? null
      : (s.current?.number ?? (s.upcoming === null ? null : s.upcoming.number - 0.5)),
  );
  const places = [...text].filter((letter) => letter !== '|' && letter !== ' ');
  const missing = places.filter((letter) => letter === 'm').length;
  return (
    <div
      className="ribbon"
      role="img"
      aria-label={words.room.ribbon({ now: Math.floor(now ?? places.length), of: places.length, missing })}
      style={{ '--ticks': String(text.length) } as CSSProperties}
    >
      <Ticks text={text} />
      {now !== null && <NowSign at={share(text, now)} />}
    </div>
  );
}

/** Where an interval's number stands, from 0 to 1 of the ribbon's length. */
function share(text: string, number: number): number {
  let seen = 0;
  for (let i = 0; i < text.length; i++) {
    if (text[i] === '|' || text[i] === ' ') continue;
    seen += 1;
    if (seen >= number) return (i + 0.5 - (seen - number)) / text.length;
  }
  return 1;
}

const Ticks = memo(function Ticks({ text }: { readonly text: string }) {
  const paths = { scored: '', waiting: '', missing: '', late: '', parts: '' };
  [...text].forEach((letter, i) => {
    const x = (i + 0.5) * 10;
    if (letter === '|') paths.parts += `M${x} 6V42`;
    else if (letter === ' ') return;
    else if (letter === 'm') paths.missing += `M${x} 24h.01`;
    else if (letter === 'w') paths.waiting += `M${x} 19V29`;
    else paths.scored += letter === 'o' ? `M${x} 19V29` : `M${x} 13V35`;
    if (letter === 'l') paths.late += `M${x} 6h.01`;
  });
  return (
    <svg
      className={`ribbon-ticks ${text.length > 130 ? 'ribbon-dense' : ''}`}
      viewBox={`0 0 ${Math.max(1, text.length) * 10} 48`}
      preserveAspectRatio="none"
      aria-hidden="true"
    >
      <path className="ribbon-part" d={paths.parts} />
      <path className="ribbon-waiting" d={paths.waiting} />
      <path className="ribbon-scored" d={paths.scored} />
      <path className="ribbon-ring" d={paths.missing} />
      <path className="ribbon-hole" d={paths.missing} />
      <path className="ribbon-late" d={paths.late} />
    </svg>
  );
});
