import { createContext, type ReactNode, useCallback, useContext, useMemo, useRef, useState } from 'react';
import type { PageMs } from '../../kernel/units.ts';
import type { RoomSnapshot } from '../../recorder/roomSnapshot.ts';
import { type Count, type CountStep, counted } from './countSteps.ts';
import { useLive, useRoom } from './useRoom.ts';

interface Counting {
  readonly count: Count;
  /** Does what a touch says, and marks it at once. */
  readonly step: (step: CountStep, at: PageMs) => void;
}

const CountingContext = createContext<Counting | null>(null);

/** The headcount of this prompt, wherever it is shown or worked. */
export function useCounting(): Counting {
  const counting = useContext(CountingContext);
  if (counting === null) throw new Error('A part of the room was rendered outside a session.');
  return counting;
}

const nobody: ReadonlySet<string> = new Set();

/** The journal knows figures only; which seats made up which figure is remembered here, so that undo brings them back. */
interface Memory {
  readonly seats: ReadonlyMap<string, ReadonlySet<string>>;
  /** Children present, said while nothing was counted yet: kept with the next count. */
  readonly present: number | null;
}

/** Which mark the figure on the glass comes from; an empty prompt has a name of its own. */
function markOf({ current, state }: RoomSnapshot): string {
  const said = current === null ? undefined : state.sayings.get(current.number)?.at(-1);
  return said === undefined ? `interval ${current?.number ?? 0}` : `${said.writer} ${said.seq}`;
}

function countIn(s: RoomSnapshot): Omit<Count, 'tapped'> {
  const number = s.current?.number ?? Number.NaN;
  return {
    on: s.current?.counts?.on ?? null,
    present: s.current?.counts?.present ?? s.present,
    last: s.intervals.findLast((line) => line.number < number && line.counts !== null)?.counts?.on ?? null,
  };
}

export function CountingFrom({ children }: { readonly children: ReactNode }) {
  const live = useLive();
  const [memory, setMemory] = useState<Memory>({ seats: new Map(), present: null });
  const latest = useRef(memory);
  const s = useRoom((snapshot) => ({ ...countIn(snapshot), mark: markOf(snapshot) }));
  const step = useCallback(
    (what: CountStep, at: PageMs): void => {
      const now = live.snapshot();
      const next = counted(countOf(countIn(now), markOf(now), latest.current), what);
      if (next === null) return;
      const keep = (after: Memory): void => {
        latest.current = after;
        setMemory(after);
      };
      if (next.on === null) {
        keep({ ...latest.current, present: next.present });
        return;
      }
      live.count(next.on, next.present, at, now.current?.number);
      // Before the first cue nothing is taken, nor the echo of a touch: then the seats stay as they were.
      if ((live.snapshot().felt?.count ?? 0) === (now.felt?.count ?? 0)) return;
      keep({ seats: new Map(latest.current.seats).set(markOf(live.snapshot()), next.tapped), present: null });
    },
    [live],
  );
  const { mark, on, present, last } = s;
  const counting = useMemo(
    () => ({ count: countOf({ on, present, last }, mark, memory), step }),
    [on, present, last, mark, memory, step],
  );
  return <CountingContext value={counting}>{children}</CountingContext>;
}

function countOf(count: Omit<Count, 'tapped'>, mark: string, { seats, present }: Memory): Count {
  return {
    ...count,
    present: count.on === null && present !== null ? present : count.present,
    tapped: seats.get(mark) ?? nobody,
  };
}
