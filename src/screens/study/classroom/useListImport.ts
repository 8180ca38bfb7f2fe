import type { ReactNode } from 'react';
import { ok, type Result } from '../../../kernel/result.ts';
import type { Classroom } from '../../../model/classroom.ts';
import { type ClassListSource, importClassList, removeChild } from '../../../tasks/index.ts';
import { useServices } from '../../services.ts';
import { useDoing } from '../useDoing.tsx';

interface ListImport {
  /** Takes a list over and says what came of it; true when it was taken. */
  readonly take: (source: ClassListSource) => Promise<boolean>;
  readonly notice: ReactNode;
  readonly busy: boolean;
}

/** Takes class lists over, says how many lines were left out, and takes the new children back when asked. */
export function useListImport(classroom: Classroom): ListImport {
  const { words, deps } = useServices();
  const { run, tell, notice, busy } = useDoing();
  const take = async (source: ClassListSource): Promise<boolean> => {
    const before = new Set(classroom.children.map((child) => child.id));
    const done = await run(importClassList(deps, classroom.id, source));
    if (!done.ok) return false;
    const { added, changed, withoutConsent, seatsLeftOpen } = done.value;
    const fresh = done.value.classroom.children.map((child) => child.id).filter((id) => !before.has(id));
    const takeBack = async (): Promise<Result<unknown>> => {
      for (const child of fresh) {
        const removed = await removeChild(deps, classroom.id, child);
        if (!removed.ok) return removed;
      }
      return ok(null);
    };
    tell(
      words.study.listDone({ added, changed, left: withoutConsent, seatsOpen: seatsLeftOpen }),
      fresh.length > 0 ? takeBack : undefined,
    );
    return true;
  };
  return { take, notice, busy };
}
