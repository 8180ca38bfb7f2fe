import { useRef, useState } from 'react';
import type { Classroom } from '../../../model/classroom.ts';
import type { SeatingPlan } from '../../../model/seatingPlan.ts';
import { seatChild } from '../../../tasks/index.ts';
import { Button } from '../../../ui/Button.tsx';
import { PlanView } from '../../plan/PlanView.tsx';
import { useServices } from '../../services.ts';
import { pseudonymsOf } from './pseudonymsOf.ts';
import { StepLine } from './StepLine.tsx';
import { type Tapped, tappedChild, tappedSeat, type Waiting } from './tapped.ts';
import type { PlanEdits } from './usePlanEdits.ts';

interface Props {
  readonly classroom: Classroom;
  readonly plan: SeatingPlan;
  readonly edits: PlanEdits;
}

/** Children go to seats by two taps, in either order. */
export function Placing({ classroom, plan, edits }: Props) {
  const { words, deps } = useServices();
  const { study, f } = words;
  const [waiting, setWaiting] = useState<Waiting | null>(null);
  const list = useRef<HTMLElement>(null);
  const labels = pseudonymsOf(classroom);
  const seated = new Set(plan.seats.map((seat) => seat.child));
  const standing = [...labels]
    .filter(([id]) => !seated.has(id))
    .sort(([, a], [, b]) => a.localeCompare(b, f.locale, { numeric: true }));
  const take = ({ waiting: next, seating }: Tapped) => {
    setWaiting(next);
    if (seating !== null) edits.step(() => seatChild(deps, classroom.id, seating.seat, seating.child));
    return seating !== null;
  };
  const name = waiting?.child == null ? undefined : labels.get(waiting.child);
  return (
    <>
      <StepLine edits={edits}>
        {waiting === null
          ? study.tapStart
          : name === undefined
            ? study.tapChildFor
            : waiting.kind === 'child'
              ? study.tapSeatFor({ name })
              : study.tapAgain({ name })}
      </StepLine>
      <div className="seating">
        <section className="stack-tight" aria-label={study.unseated} tabIndex={-1} ref={list}>
          <h2 className="seating-head">{study.unseated}</h2>
          {standing.length === 0 && <p className="second">{study.allSeated}</p>}
          <div className="seating-children">
            {standing.map(([id, pseudonym]) => (
              <Button
                key={id}
                className={waiting?.child === id ? 'seating-child seating-waits' : 'seating-child'}
                aria-pressed={waiting?.child === id}
                onClick={() => {
                  // A seated child leaves the list; the keyboard stays in it.
                  if (take(tappedChild(waiting, id))) list.current?.focus();
                }}
              >
                {pseudonym}
              </Button>
            ))}
          </div>
        </section>
        <PlanView
          plan={plan}
          labels={labels}
          label={study.planPicture({ klass: classroom.name })}
          chosen={waiting?.kind === 'seat' ? waiting.seat : null}
          fitHeight="62dvh"
          onSeat={(seat) => take(tappedSeat(waiting, seat))}
        />
      </div>
    </>
  );
}
