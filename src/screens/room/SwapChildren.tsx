import { useMemo, useState } from 'react';
import { swapPairs } from '../../recorder/swapPairs.ts';
import { Button } from '../../ui/Button.tsx';
import { useCoreWords } from '../coreServices.ts';
import { useIsAbout } from './aboutChildren.ts';
import { Panel } from './Panel.tsx';
import { useFacts } from './RoomFacts.tsx';
import { useHeld } from './useHeld.ts';
import { useLive, useRoom } from './useRoom.ts';

interface Props {
  readonly onClose: () => void;
}

/** Two children taken for each other: who and who, then over how many of the last looks. */
export function SwapChildren({ onClose }: Props) {
  const { room } = useCoreWords();
  const { pseudonyms } = useFacts();
  const [chosen, setChosen] = useState<readonly string[]>([]);
  const intervals = useRoom((s) => s.intervals);
  const watched = useMemo(
    () =>
      new Set(
        intervals.flatMap(({ status, child }) => (status === 'waiting' || child === null ? [] : [child])),
      ),
    [intervals],
  );
  const [one, other] = chosen;
  useIsAbout(one ?? null, other ?? null);
  if (one !== undefined && other !== undefined) return <Pairs one={one} other={other} onClose={onClose} />;
  const nameOf = (child: string): string => pseudonyms.get(child) ?? child;
  return (
    <Panel
      key={one ?? 'first'}
      title={one === undefined ? room.swapFirst : room.swapSecond({ child: nameOf(one) })}
      onClose={onClose}
    >
      <div className="panel-choices">
        {[...pseudonyms.keys()]
          .filter((child) => watched.has(child) && child !== one)
          .map((child) => (
            <Button key={child} onClick={() => setChosen([...chosen, child])}>
              {nameOf(child)}
            </Button>
          ))}
      </div>
    </Panel>
  );
}

interface PairsProps extends Props {
  readonly one: string;
  readonly other: string;
}

function Pairs({ one, other, onClose }: PairsProps) {
  const live = useLive();
  const { room } = useCoreWords();
  const { pseudonyms } = useFacts();
  const held = useHeld();
  const intervals = useRoom((s) => s.intervals);
  const round = useRoom((s) => s.lastRound.length);
  const come = intervals.filter(({ status }) => status !== 'waiting').length;
  const [last, setLast] = useState(Math.max(2, round));
  const pairs = swapPairs(intervals, [one, other], last);
  const nameOf = (child: string): string => pseudonyms.get(child) ?? child;
  const heldBy = (number: number): string => {
    const look = intervals[number - 1];
    return look === undefined ? '' : held(look);
  };
  const swap = (): void => {
    live.swap(pairs);
    onClose();
  };
  return (
    <Panel
      key="pairs"
      title={room.swapTitle({ one: nameOf(one), other: nameOf(other) })}
      onClose={onClose}
      actions={
        <Button look="main" disabled={pairs.length === 0} onClick={swap}>
          {room.swapDo({ n: pairs.length })}
        </Button>
      }
    >
      <div className="swap-over">
        <Button aria-label={room.swapFewer} disabled={last <= 2} onClick={() => setLast(last - 1)}>
          <StepSign d="M4 10H16" />
        </Button>
        <p>{room.swapOver({ n: Math.min(last, come) })}</p>
        <Button aria-label={room.swapMore} disabled={last >= come} onClick={() => setLast(last + 1)}>
          <StepSign d="M10 4V16M4 10H16" />
        </Button>
      </div>
      {pairs.length === 0 ? (
        <p>{room.swapNothing}</p>
      ) : (
        <ul className="swap-pairs">
          {pairs.toReversed().map(([first, second]) => (
            <li key={first}>
              {room.swapPair({
                one: { number: first, name: nameOf(one) },
                other: { number: second, name: nameOf(other) },
                gets: heldBy(second),
                otherGets: heldBy(first),
              })}
            </li>
          ))}
        </ul>
      )}
    </Panel>
  );
}

function StepSign({ d }: { readonly d: string }) {
  return (
    <svg width="20" height="20" viewBox="0 0 20 20" aria-hidden="true">
      <path className="step-sign" d={d} />
    </svg>
  );
}
