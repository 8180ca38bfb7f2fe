import { useState } from 'react';
import type { IntervalRecord } from '../../journal/readOut.ts';
import type { Correction } from '../../recorder/liveSession.ts';
import { Button } from '../../ui/Button.tsx';
import { useCoreWords } from '../coreServices.ts';
import { useIsAbout } from './aboutChildren.ts';
import { LookList } from './LookList.tsx';
import { Panel } from './Panel.tsx';
import { useFacts } from './RoomFacts.tsx';
import { ShouldBe } from './ShouldBe.tsx';
import { heldAfter, useHeld } from './useHeld.ts';
import { useLive, useRoom } from './useRoom.ts';

interface Props {
  readonly onClose: () => void;
}

/** One of the last looks: which one, then what it should be. */
export function CorrectLook({ onClose }: Props) {
  const { room } = useCoreWords();
  const { unit } = useFacts();
  const looks = useRoom((s) => s.lastRound);
  const [number, setNumber] = useState<number | null>(null);
  const look = useRoom((s) => (number === null ? null : (s.intervals[number - 1] ?? null)));
  if (look !== null) return <AboutLook look={look} onClose={onClose} />;
  return (
    <Panel key="which" title={unit === 'scan' ? room.scanTitle : room.lookTitle} onClose={onClose}>
      {looks.length === 0 ? (
        <p>{room.correctNothing}</p>
      ) : (
        <LookList looks={looks} onChoose={(chosen) => setNumber(chosen.number)} />
      )}
    </Panel>
  );
}

function AboutLook({ look, onClose }: { readonly look: IntervalRecord; readonly onClose: () => void }) {
  const live = useLive();
  const { room } = useCoreWords();
  const { pseudonyms } = useFacts();
  const held = useHeld();
  useIsAbout(look.child);
  const [to, setTo] = useState<Correction | null>(null);
  const from = held(look);
  const then = to === null ? null : held(heldAfter(to));
  const correct = (): void => {
    if (to !== null) live.correct(look.number, to);
    onClose();
  };
  return (
    <Panel
      key="about"
      title={room.lookAbout({
        number: look.number,
        name: look.child === null ? '' : (pseudonyms.get(look.child) ?? ''),
        held: from,
      })}
      onClose={onClose}
      actions={
        <Button look="main" disabled={then === null || then === from} onClick={correct}>
          {room.correctDo}
        </Button>
      }
    >
      <ShouldBe look={look} to={to} onChange={setTo} />
      <p className="will-be">
        {then !== null && (then === from ? room.willStay : room.willBe({ from, to: then }))}
      </p>
    </Panel>
  );
}
