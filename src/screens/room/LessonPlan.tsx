import { useMemo } from 'react';
import type { SeatingPlan } from '../../model/seatingPlan.ts';
import { useCoreWords } from '../coreServices.ts';
import { PlanView } from '../plan/PlanView.tsx';
import { useFacts } from './RoomFacts.tsx';
import { useRoom } from './useRoom.ts';

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

/** The seats as the observer sees them: brass = now, dashed = next. Who is away is said below. */
export function LessonPlan() {
  const words = useCoreWords();
  const { pseudonyms, header } = useFacts();
  const plan = usePlanNow();
  const current = useRoom((s) => s.current?.child ?? null);
  const next = useRoom((s) => s.upcoming?.child ?? null);
  const away = useRoom((s) => s.away);
  const awayNames = header.children.filter((child) => away.has(child.id));
  // The seat of a child who is away looks free, so that nobody searches there.
  const labels = useMemo(
    () => new Map([...pseudonyms].filter(([child]) => !away.has(child) || child === current)),
    [pseudonyms, away, current],
  );
  return (
    <div className="lesson-plan">
      {plan !== null && plan.seats.length > 0 && (
        <div className="lesson-plan-box">
          <PlanView
            plan={plan}
            labels={labels}
            label={words.room.plan}
            current={current}
            next={next}
            fitHeight="100cqh - var(--you)"
          />
        </div>
      )}
      {awayNames.length > 0 && (
        <p className="lesson-plan-away">
          {words.room.awayList({
            children: awayNames.map((child) =>
              words.room.childAway({
                child: child.pseudonym,
                reason: words.missing[away.get(child.id) ?? 'not taking part'],
              }),
            ),
          })}
        </p>
      )}
    </div>
  );
}
