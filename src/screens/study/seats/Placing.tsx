import { useState } from 'react';
import type { Classroom } from '../../../model/classroom.ts';
import type { SeatingPlan } from '../../../model/seatingPlan.ts';
import { seatChild } from '../../../tasks/index.ts';
import { Button } from '../../../ui/Button.tsx';
import { Sheet } from '../../../ui/Sheet.tsx';
import { PlanView } from '../../plan/PlanView.tsx';
import { useServices } from '../../services.ts';
import { pseudonymsOf } from './pseudonymsOf.ts';
import { SideChoice } from './SideChoice.tsx';
import { type Tapped, tappedChild, tappedSeat, type Waiting } from './tapped.ts';
import type { PlanEdits } from './usePlanEdits.ts';
import './seats.css';

interface Props {
  readonly classroom: Classroom;
  readonly plan: SeatingPlan;
  readonly edits: PlanEdits;
}

/** Children go to seats by two taps, in either order. */
export function Placing({ classroom, plan, edits }: Props) {
  const { words, deps } = useServices();
  const { study } = words;
  const [waiting, setWaiting] = useState<Waiting | null>(null);
  const labels = pseudonymsOf(classroom);
  const seated = new Set(plan.seats.map((seat) => seat.child));
  const standing = [...labels].filter(([id]) => !seated.has(id));
  const take = ({ waiting: next, seating }: Tapped) => {
    setWaiting(next);
    if (seating !== null) void edits.step(() => seatChild(deps, classroom.id, seating.seat, seating.child));
  };
  const name = waiting?.child == null ? undefined : labels.get(waiting.child);
  return (
    <Sheet>
      <div className="stack">
        <p role="status">
          {waiting === null
            ? study.tapStart
            : name === undefined
              ? study.tapChildFor
              : waiting.kind === 'child'
                ? study.tapSeatFor({ name })
                : study.tapAgain({ name })}
        </p>
        <div className="seating">
          <PlanView
            plan={plan}
            labels={labels}
            label={study.planPicture({ klass: classroom.name })}
            chosen={waiting?.kind === 'seat' ? waiting.seat : null}
            fitHeight="62dvh"
            onSeat={(seat) => take(tappedSeat(waiting, seat))}
          />
          <section className="stack-tight" aria-label={study.unseated}>
            <h2>{study.unseated}</h2>
            {standing.length === 0 && <p className="second">{study.allSeated}</p>}
            <div className="seating-children">
              {standing.map(([id, pseudonym]) => (
                <Button
                  key={id}
                  className={waiting?.child === id ? 'seating-waits' : ''}
                  aria-pressed={waiting?.child === id}
                  onClick={() => take(tappedChild(waiting, id))}
                >
                  {pseudonym}
                </Button>
              ))}
            </div>
            <div className="row">
              <Button disabled={edits.undo === null || edits.busy} onClick={() => edits.undo?.()}>
                {words.common.undo}
              </Button>
            </div>
          </section>
        </div>
        <SideChoice plan={plan} edits={edits} />
      </div>
    </Sheet>
  );
}
