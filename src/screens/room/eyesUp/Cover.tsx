import { useEffect, useId, useRef, useState } from 'react';
import { Hold } from '../../../ui/Sign.tsx';
import { useCoreServices } from '../../coreServices.ts';
import { LookAt } from '../LookAt.tsx';
import { useFacts } from '../RoomFacts.tsx';
import { useRoom } from '../useRoom.ts';
import { ZoneTargets } from './ZoneTargets.tsx';
import type { Zones } from './zones.ts';
import './cover.css';

interface Props {
  /** Where marks are possible without words; null where there are too many to be told apart, or nothing to mark. */
  readonly zones: Zones | null;
  /** Nobody is to be looked at now. */
  readonly still: boolean;
  readonly onUncover: () => void;
}

/**
 * An empty page of an exercise book in place of the lesson: a child who passes reads nothing on it but how to turn it. Prompts go
 * on, and marks are still possible at the places of the eyes-up layout. Only screen readers are told names.
 */
export function Cover({ zones, still, onUncover }: Props) {
  const { words } = useCoreServices();
  const { room } = words;
  const { method } = useFacts();
  return (
    <>
      <EmptyPage />
      <div className="visually-hidden">
        <p>{room.covered}</p>
        {still ? <h1>{room.coveredStill}</h1> : method === 'headcount' ? <h1>{room.howMany}</h1> : <LookAt />}
        {zones === null && !still && <p>{room.coveredKeys}</p>}
      </div>
      {zones !== null && <ZoneTargets zones={zones} covered />}
      <Corner onUncover={onUncover} />
    </>
  );
}

function EmptyPage() {
  const lines = useId();
  return (
    <svg className="cover-page" width="100%" height="100%" aria-hidden="true">
      <pattern id={lines} width="100" height="44" patternUnits="userSpaceOnUse">
        <path className="cover-line" d="M0 43H100" />
      </pattern>
      <rect width="100%" height="100%" fill={`url(#${lines})`} />
      <line className="cover-margin" x1="11%" x2="11%" y1="0" y2="100%" />
    </svg>
  );
}

/** So long the corner is held before the page turns: longer than any passing hand. */
const holdMs = 800;
/** So long it says what to do after a touch that was too short. */
const hintMs = 2000;

/** The folded corner: held, it turns the page. The key that covers uncovers too, and so does a screen reader's click. */
function Corner({ onUncover }: { readonly onUncover: () => void }) {
  const { words, device } = useCoreServices();
  const [held, setHeld] = useState<'no' | 'holding' | 'too short'>('no');
  const waiting = useRef<() => void>(() => undefined);
  const trouble = useRoom((s) => s.kept.refused !== null || (s.sound.on && !s.sound.heard));
  useEffect(() => () => waiting.current(), []);
  const wait = (ms: number, then: () => void): void => {
    waiting.current();
    waiting.current = device.wakeIn(ms, then);
  };
  const hold = (): void => {
    setHeld('holding');
    wait(holdMs, onUncover);
  };
  const letGo = (): void => {
    if (held !== 'holding') return;
    setHeld('too short');
    wait(hintMs, () => setHeld('no'));
  };
  return (
    <div className="cover-foot">
      {trouble && <Hold />}
      <span className={`cover-hint ${held === 'too short' ? 'cover-hint-loud' : ''}`}>
        {held === 'too short' ? words.room.uncoverLonger : words.room.uncoverHow}
      </span>
      <button
        type="button"
        className={`cover-corner ${held === 'holding' ? 'cover-corner-held' : ''}`}
        aria-label={words.room.uncover}
        onPointerDown={hold}
        onPointerUp={letGo}
        onPointerCancel={letGo}
        onPointerLeave={letGo}
        onClick={(event) => {
          // No finger made this click.
          if (event.detail === 0) onUncover();
        }}
      >
        <svg width="56" height="56" viewBox="0 0 56 56" aria-hidden="true">
          <path className="cover-fold" d="M8 56L56 8V56Z" />
          <path className="cover-flap" d="M8 56L56 8H14Q8 8 8 14Z" />
        </svg>
      </button>
    </div>
  );
}
