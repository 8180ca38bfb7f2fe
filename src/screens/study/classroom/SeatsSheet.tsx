import type { Classroom } from '../../../model/classroom.ts';
import { Sheet } from '../../../ui/Sheet.tsx';
import { PlanView } from '../../plan/PlanView.tsx';
import { useWords } from '../../services.ts';
import { pseudonymsOf } from '../seats/pseudonymsOf.ts';

/** The seating plan as it stands, and the way to its editor. */
export function SeatsSheet({ classroom }: { readonly classroom: Classroom }) {
  const { study } = useWords();
  const { plan } = classroom;
  const labels = pseudonymsOf(classroom);
  return (
    <Sheet title={study.seats} className="seats-picture">
      <div className="stack-tight">
        <p className="second">
          {plan === null
            ? study.seatsNone
            : study.seatsSome({
                seated: plan.seats.filter((seat) => seat.child !== null).length,
                children: labels.size,
              })}
        </p>
        {plan !== null && (
          <PlanView
            plan={plan}
            labels={labels}
            label={study.planPicture({ klass: classroom.name })}
            fitHeight="18rem"
          />
        )}
        <p>
          <a className="button" href={`#/study/class/${classroom.id}/seats`}>
            {study.seatsOpen}
          </a>
        </p>
      </div>
    </Sheet>
  );
}
