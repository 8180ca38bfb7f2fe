import type { ObserverSide, SeatingPlan } from '../../../model/seatingPlan.ts';
import { turnPlan } from '../../../tasks/index.ts';
import { Choice } from '../../../ui/Choice.tsx';
import { useServices } from '../../services.ts';
import type { PlanEdits } from './usePlanEdits.ts';

/** Where the observer sits; the plan turns at once. */
export function SideChoice({ plan, edits }: { readonly plan: SeatingPlan; readonly edits: PlanEdits }) {
  const { words, deps } = useServices();
  const { study } = words;
  return (
    <div className="stack-tight">
      <Choice<ObserverSide>
        legend={study.side}
        value={plan.observerSide}
        onChange={(side) => edits.step(() => turnPlan(deps, edits.classroom, side))}
        options={[
          { value: 'back', label: study.sideBack },
          { value: 'front', label: study.sideFront },
          { value: 'left', label: study.sideLeft },
          { value: 'right', label: study.sideRight },
        ]}
      />
      <p className="second small">{study.sideHint}</p>
    </div>
  );
}
