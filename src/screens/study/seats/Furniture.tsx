import { useEffect, useRef, useState } from 'react';
import type { Classroom } from '../../../model/classroom.ts';
import type { Seat, SeatingPlan } from '../../../model/seatingPlan.ts';
import { addSeat, setSeatingPlan } from '../../../tasks/index.ts';
import { Button } from '../../../ui/Button.tsx';
import { Check } from '../../../ui/Choice.tsx';
import { PlanView } from '../../plan/PlanView.tsx';
import type { Place } from '../../plan/turned.ts';
import { useServices } from '../../services.ts';
import { grownFor, moved, tableBeside, trimmed } from './grown.ts';
import { pseudonymsOf } from './pseudonymsOf.ts';
import { StepLine } from './StepLine.tsx';
import type { PlanEdits } from './usePlanEdits.ts';

interface Props {
  readonly classroom: Classroom;
  readonly plan: SeatingPlan;
  readonly edits: PlanEdits;
}

/** Seats are put up and taken away by tapping places, one at a time. */
export function Furniture({ classroom, plan, edits }: Props) {
  const { words, deps } = useServices();
  const { study } = words;
  const { id } = classroom;
  const [joins, setJoins] = useState(true);
  const room = useRef<HTMLDivElement>(null);
  const tapped = useRef<Place | null>(null);
  // The button under the finger is another one once the seat stands or is gone: the keyboard stays in its place.
  // biome-ignore lint/correctness/useExhaustiveDependencies: to be looked at after every change of the plan
  useEffect(() => {
    if (tapped.current === null || document.activeElement !== document.body) return;
    const { column, row } = tapped.current;
    room.current?.querySelector<HTMLElement>(`[data-place="${column} ${row}"]`)?.focus();
  }, [plan]);
  const putUp = (tappedPlace: Place) =>
    edits.step(async (standing) => {
      const now = standing ?? plan;
      const grown = grownFor(now, moved(plan, now, tappedPlace));
      if (grown.plan !== now) {
        const wider = await setSeatingPlan(deps, id, grown.plan);
        if (!wider.ok) return wider;
      }
      tapped.current = grown.place;
      const table = joins ? tableBeside(grown.plan, grown.place) : undefined;
      return addSeat(deps, id, { ...grown.place, ...(table === undefined ? {} : { table }) });
    });
  const takeAway = (seat: Seat) =>
    edits.step((standing) => {
      const now = standing ?? plan;
      const left = { ...now, seats: now.seats.filter((one) => one.id !== seat.id) };
      const small = trimmed(left);
      tapped.current = moved(left, small, moved(plan, now, seat));
      return setSeatingPlan(deps, id, small);
    });
  return (
    <>
      <StepLine edits={edits}>{study.buildHint}</StepLine>
      <div ref={room}>
        <PlanView
          plan={plan}
          labels={pseudonymsOf(classroom)}
          label={study.planPicture({ klass: classroom.name })}
          fitHeight="62dvh"
          onSeat={takeAway}
          onPlace={putUp}
        />
      </div>
      <div className="row">
        <Check label={study.joins} checked={joins} onChange={setJoins} />
        <Button look="quiet" onClick={() => edits.step(() => setSeatingPlan(deps, id, null))}>
          {study.planAway}
        </Button>
      </div>
    </>
  );
}
