import type { ReactNode } from 'react';
import { canonicalJson } from '../../../kernel/canonicalJson.ts';
import { ok, type Result } from '../../../kernel/result.ts';
import type { Classroom } from '../../../model/classroom.ts';
import {
  type ClassListSource,
  importClassList,
  removeChild,
  renameChild,
  setSeatingPlan,
} from '../../../tasks/index.ts';
import { useServices } from '../../services.ts';
import { useDoing } from '../useDoing.tsx';

interface ListImport {
  /** Takes a list over and says what came of it; true when it was taken. */
  readonly take: (source: ClassListSource) => Promise<boolean>;
  readonly notice: ReactNode;
  readonly busy: boolean;
}

/** Takes class lists over, says how many lines were left out, and takes all of it back when asked. */
export function useListImport(classroom: Classroom): ListImport {
  const { words, deps } = useServices();
  const { run, tell, notice, busy } = useDoing();
  const take = async (source: ClassListSource): Promise<boolean> => {
    const before = new Map(classroom.children.map((child) => [child.id, child]));
    const done = await run(importClassList(deps, classroom.id, source));
    if (!done.ok) return false;
    const { added, changed, withoutConsent, seatsLeftOpen } = done.value;
    const takeBack = async (): Promise<Result<unknown>> => {
      for (const { id, stratum } of done.value.classroom.children) {
        const old = before.get(id);
        if (old?.stratum === stratum) continue;
        const back =
          old === undefined
            ? await removeChild(deps, classroom.id, id)
            : await renameChild(deps, classroom.id, id, { stratum: old.stratum });
        if (!back.ok) return back;
      }
      return samePlan(classroom, done.value.classroom)
        ? ok(null)
        : setSeatingPlan(deps, classroom.id, classroom.plan);
    };
    tell(
      words.study.listDone({ added, changed, left: withoutConsent, seatsOpen: seatsLeftOpen }),
      added + changed > 0 || !samePlan(classroom, done.value.classroom) ? takeBack : undefined,
    );
    return true;
  };
  return { take, notice, busy };
}

const samePlan = (a: Classroom, b: Classroom): boolean => canonicalJson(a.plan) === canonicalJson(b.plan);
