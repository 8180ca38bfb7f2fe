import { useState } from 'react';
import type { SeatingPlan } from '../../../model/seatingPlan.ts';
import { addSeat, removeSeat, setSeatingPlan } from '../../../tasks/index.ts';
import { Button } from '../../../ui/Button.tsx';
import { Check } from '../../../ui/Choice.tsx';
import { Sheet } from '../../../ui/Sheet.tsx';
import { PlanView } from '../../plan/PlanView.tsx';
import type { Place } from '../../plan/turned.ts';
import { useServices } from '../../services.ts';
import { grownFor, tableBeside, trimmed } from './grown.ts';
import type { PlanEdits } from './usePlanEdits.ts';

/** Seats are put up and taken away by tapping places, one at a time. */
export function Furniture({ plan, edits }: { readonly plan: SeatingPlan; readonly edits: PlanEdits }) {
  const { words, deps } = useServices();
  const { study } = words;
  const [open, setOpen] = useState(false);
  const [joins, setJoins] = useState(true);
  const { classroom } = edits;
  const putUp = (place: Place) =>
    edits.step(async () => {
      const grown = grownFor(plan, place);
      if (grown.plan !== plan) {
        const moved = await setSeatingPlan(deps, classroom, grown.plan);
        if (!moved.ok) return moved;
      }
      const table = joins ? tableBeside(grown.plan, grown.place) : undefined;
      return addSeat(deps, classroom, { ...grown.place, ...(table === undefined ? {} : { table }) });
    });
  const takeAway = (seat: string) =>
    edits.step(async () => {
      const removed = await removeSeat(deps, classroom, seat);
      if (!removed.ok || removed.value.plan === null) return removed;
      return setSeatingPlan(deps, classroom, trimmed(removed.value.plan));
    });
  return (
    <Sheet>
      <div className="stack">
        <div className="row">
          <Button aria-expanded={open} onClick={() => setOpen(!open)}>
            {study.seatsBuild}
          </Button>
        </div>
        {open && (
          <>
            <p className="second">{study.buildHint}</p>
            <Check label={study.joins} checked={joins} onChange={setJoins} />
            <PlanView
              plan={plan}
              labels={noLabels}
              label={study.seatsBuild}
              onSeat={(seat) => void takeAway(seat.id)}
              onPlace={(place) => void putUp(place)}
            />
            <div className="row">
              <Button disabled={edits.undo === null || edits.busy} onClick={() => edits.undo?.()}>
                {words.common.undo}
              </Button>
              <Button
                look="quiet"
                onClick={() => void edits.step(() => setSeatingPlan(deps, classroom, null))}
              >
                {study.planAway}
              </Button>
            </div>
          </>
        )}
      </div>
    </Sheet>
  );
}

const noLabels: ReadonlyMap<string, string> = new Map();
