import { type ReactNode, useState } from 'react';
import type { Result } from '../../../kernel/result.ts';
import type { Classroom } from '../../../model/classroom.ts';
import type { SeatingPlan } from '../../../model/seatingPlan.ts';
import { setSeatingPlan } from '../../../tasks/index.ts';
import { useServices } from '../../services.ts';
import { useDoing } from '../useDoing.tsx';

export interface PlanEdits {
  readonly classroom: string;
  /** Does one step and remembers how the plan stood before. */
  readonly step: (edit: () => Promise<Result<unknown>>) => Promise<Result<unknown>>;
  /** Takes the last step back; null when there is none. */
  readonly undo: (() => void) | null;
  readonly busy: boolean;
  readonly notice: ReactNode;
}

/** Steps on a seating plan, each of which can be taken back, the latest first. */
export function usePlanEdits(classroom: Classroom): PlanEdits {
  const { deps } = useServices();
  const { run, notice, busy } = useDoing();
  const [before, setBefore] = useState<readonly (SeatingPlan | null)[]>([]);
  const step: PlanEdits['step'] = async (edit) => {
    const standing = classroom.plan;
    const done = await run(edit());
    if (done.ok) setBefore((steps) => [...steps, standing]);
    return done;
  };
  const undo = async () => {
    const last = before.at(-1);
    if (last === undefined) return;
    const done = await run(setSeatingPlan(deps, classroom.id, last));
    if (done.ok) setBefore((steps) => steps.slice(0, -1));
  };
  return {
    classroom: classroom.id,
    step,
    undo: before.length === 0 ? null : () => void undo(),
    busy,
    notice,
  };
}
