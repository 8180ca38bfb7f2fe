import { use, useMemo } from 'react';
import type { SeatingPlan } from '../../model/seatingPlan.ts';
import { useCoreWords } from '../coreServices.ts';
import { PlanView } from '../plan/PlanView.tsx';
import { AboutChildren } from './aboutChildren.ts';
import { CountSeat } from './CountSeat.tsx';
import { useFacts } from './RoomFacts.tsx';
import { useRoom } from './useRoom.ts';
import { useStandIns } from './useStandIns.ts';
import { useSweepRest } from './useSweep.ts';

/** The plan with every child where it sits now. */
export function usePlanNow(): SeatingPlan | null {
  const { plan } = useFacts().header;
  const seats = useRoom((s) => s.seats);
  return useMemo(() => {
    if (plan === null) return null;
    const sitting = new Map([...seats].map(([child, seat]) => [seat, child]));
    const moved = new Set(seats.keys());
    return {
      ...plan,
      seats: plan.seats.map((seat) => ({
        ...seat,
        // A seat whose child sits elsewhere now is free, until somebody else is found on it.
        child: sitting.get(seat.id) ?? (seat.child !== null && moved.has(seat.child) ? null : seat.child),
      })),
    };
  }, [plan, seats]);
}

/** The seats as the observer sees them: brass = now, dashed = next, ink = whom the open panel is about. Who is away is said below. */
export function LessonPlan() {
  const { room } = useCoreWords();
  const { header, method } = useFacts();
  const plan = usePlanNow();
  const resting = useSweepRest();
  const current = useRoom((s) => (resting ? null : (s.current?.child ?? null)));
  const next = useRoom((s) => s.upcoming?.child ?? null);
  const labels = useLabels(current);
  const about = use(AboutChildren).children;
  const seats = useRoom((s) => s.seats);
  const chosen = useMemo(() => new Set(about.map((child) => seats.get(child) ?? '')), [about, seats]);
  const counts = method === 'headcount';
  return (
    <div className="lesson-plan">
      {plan !== null && plan.seats.length > 0 && (
        <div className="lesson-plan-box">
          <PlanView
            plan={plan}
            labels={labels}
            label={counts ? room.planCount : room.plan}
            current={current}
            next={next}
            chosen={chosen}
            fitHeight="100cqh - var(--you)"
            seatAtMost={148}
            {...(counts
              ? {
                  seatAs: (seat, look) =>
                    seat.child === null ? null : <CountSeat key={seat.id} child={seat.child} look={look} />,
                }
              : {})}
          />
        </div>
      )}
      <Away among={header.children.concat(header.reserves ?? [])} />
    </div>
  );
}

/** Whose names stand on the seats: not those of who is away, so that nobody searches there; of the reserves only who stands in. */
function useLabels(current: string | null): ReadonlyMap<string, string> {
  const { pseudonyms, header } = useFacts();
  const away = useRoom((s) => s.away);
  const standIns = useStandIns();
  return useMemo(() => {
    const reserves = new Set((header.reserves ?? []).map(({ id }) => id));
    const inPlace = new Set(standIns.values());
    const shown = (child: string): boolean =>
      child === current || (!away.has(child) && (!reserves.has(child) || inPlace.has(child)));
    return new Map([...pseudonyms].filter(([child]) => shown(child)));
  }, [pseudonyms, header, away, standIns, current]);
}

function Away({ among }: { readonly among: readonly { id: string; pseudonym: string }[] }) {
  const words = useCoreWords();
  const { pseudonyms } = useFacts();
  const away = useRoom((s) => s.away);
  const standIns = useStandIns();
  const gone = among.filter(({ id }) => away.has(id));
  if (gone.length === 0) return null;
  const { room, missing } = words;
  const said = gone.map(({ id, pseudonym }) => {
    const reason = missing[away.get(id) ?? 'not taking part'];
    const by = pseudonyms.get(standIns.get(id) ?? '');
    return by === undefined
      ? room.childAway({ child: pseudonym, reason })
      : room.awayStoodIn({ child: pseudonym, reason, by });
  });
  return <p className="lesson-plan-away">{room.awayList({ children: said })}</p>;
}
