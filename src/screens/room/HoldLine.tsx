import { useState } from 'react';
import type { RoomSnapshot } from '../../recorder/roomSnapshot.ts';
import { Button } from '../../ui/Button.tsx';
import { Hold } from '../../ui/Sign.tsx';
import { say } from '../../words/say.ts';
import { useCoreWords } from '../coreServices.ts';
import { useFacts } from './RoomFacts.tsx';
import { useLive, useRoom } from './useRoom.ts';

/** Which hold comes first; the others wait until it is gone or seen. */
function holdsOf(s: RoomSnapshot) {
  const gap = s.state.gaps.at(-1) ?? null;
  const here = s.phase === 'running' || s.phase === 'interrupted' || s.phase === 'counting in';
  return {
    refused: s.kept.refused,
    kept: s.kept.refused === null ? 0 : s.kept.kept,
    of: s.kept.refused === null ? 0 : s.kept.of,
    output: here && !s.sound.on && s.sound.cause === 'device',
    stuck: here && s.sound.on && !s.sound.heard,
    waits: s.startsIn !== null,
    awake: s.phase !== 'ended' && (s.wakeLock === 'refused' || s.wakeLock === 'missing'),
    gap,
    gaps: s.state.gaps.length,
    refusal: s.refusal,
    interval: s.current?.number ?? null,
  };
}

/** One calm sentence at a fixed place: nothing moves when it comes or goes. `leaving` counts attempts to go back. */
export function HoldLine({ leaving }: { readonly leaving: number }) {
  const live = useLive();
  const { room, problems } = useCoreWords();
  const { unit } = useFacts();
  const s = useRoom(holdsOf);
  const [seen, setSeen] = useState(() => ({ gaps: 0, leaving: 0, awake: false }));
  const refusal = useFreshRefusal(s);

  const line = (text: string, action?: { readonly label: string; readonly act: () => void }) => (
    <>
      <Hold />
      <p className="hold-text">{text}</p>
      {action !== undefined && (
        <Button className="rare" onClick={action.act}>
          {action.label}
        </Button>
      )}
    </>
  );
  const dismiss = (changes: Partial<typeof seen>) => ({
    label: room.dismiss,
    act: () => setSeen((before) => ({ ...before, ...changes })),
  });
  const sound = (label: string) => ({ label, act: () => live.silence(false) });

  let content = null;
  if (s.refused !== null)
    content = line(room.holdRefused({ kept: s.kept, of: s.of, why: say(problems, s.refused) }));
  else if (s.output) content = line(room.holdOutput, sound(room.holdSoundOn));
  else if (s.stuck) content = line(room.holdSoundStuck, sound(room.holdSoundTry));
  else if (leaving > seen.leaving) content = line(room.holdLeave, dismiss({ leaving }));
  else if (refusal !== null)
    content = line(
      unit !== 'look' && refusal === 'after the last interval'
        ? room.notTakenAfterLast
        : room.notTaken({ why: refusal }),
    );
  else if (s.gap !== null && s.gaps > seen.gaps)
    content = line(
      room.holdGap({
        seconds: Math.round((s.gap.to - s.gap.from) / 1000),
        cause: s.gap.cause,
        continuous: unit === 'time',
      }),
      dismiss({ gaps: s.gaps }),
    );
  else if (s.awake && !seen.awake) content = line(room.holdAwake, dismiss({ awake: true }));
  else if (s.waits)
    content = (
      <>
        <p className="hold-text second">{room.waitsOther}</p>
        <Button className="rare" onClick={() => live.callOff()}>
          {room.callOff}
        </Button>
      </>
    );
  return (
    <div className={`hold-line ${s.waits ? 'hold-line-waits' : ''}`} role="status">
      {content}
    </div>
  );
}

/** Why the last touch was not taken, until the next look; echoes of one touch are not worth a word. */
function useFreshRefusal({ refusal, interval }: ReturnType<typeof holdsOf>): string | null {
  const [at, setAt] = useState({ count: refusal?.count ?? 0, interval });
  const isNew = refusal !== null && refusal.count > at.count;
  const [shown, setShown] = useState(false);
  if (isNew) {
    setAt({ count: refusal.count, interval });
    setShown(true);
  } else if (shown && at.interval !== interval) setShown(false);
  return shown && refusal !== null && refusal.why !== 'double touch' ? refusal.why : null;
}
