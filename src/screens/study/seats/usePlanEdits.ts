import { type ReactNode, useRef, useState } from 'react';
import type { Result } from '../../../kernel/result.ts';
import type { Classroom } from '../../../model/classroom.ts';
import type { SeatingPlan } from '../../../model/seatingPlan.ts';
import { setSeatingPlan } from '../../../tasks/index.ts';
import { useServices } from '../../services.ts';
import { useDoing } from '../useDoing.tsx';

export interface PlanEdits {
  readonly classroom: string;
  /** Does one step on the plan as it stands when its turn comes, and remembers how it stood. */
  readonly step: (edit: (standing: SeatingPlan | null) => Promise<Result<unknown>>) => void;
  /** Takes the last step back; null when there is none. */
  readonly undo: (() => void) | null;
  readonly notice: ReactNode;
}

/** Steps on a seating plan, one after another however fast they are tapped; each can be taken back, the latest first. */
export function usePlanEdits(classroom: Classroom): PlanEdits {
  const { deps } = useServices();
  const { run, notice } = useDoing();
  const before = useRef<(SeatingPlan | null)[]>([]);
  const [steps, setSteps] = useState(0);
  const last = useRef<Promise<unknown>>(Promise.resolve());
  const inTurn = (work: () => Promise<unknown>) => {
    last.current = last.current.then(work, work);
  };
  const step: PlanEdits['step'] = (edit) =>
    inTurn(async () => {
      const found = await deps.store.classroom(classroom.id);
      if (!found.ok) return run(Promise.resolve(found));
      const standing = found.value?.plan ?? null;
      const done = await run(edit(standing));
      if (done.ok) setSteps(before.current.push(standing));
    });
  const undo = () =>
    inTurn(async () => {
      const standing = before.current.at(-1);
      if (standing === undefined) return;
      const done = await run(setSeatingPlan(deps, classroom.id, standing));
      if (done.ok) before.current.pop();
      setSteps(before.current.length);
    });
  return { classroom: classroom.id, step, undo: steps === 0 ? null : undo, notice };
}
