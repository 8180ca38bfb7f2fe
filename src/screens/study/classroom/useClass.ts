import type { Result } from '../../../kernel/result.ts';
import type { Classroom } from '../../../model/classroom.ts';
import type { Study } from '../../../model/study.ts';
import { useServices } from '../../services.ts';

export interface ClassOfStudy {
  readonly classroom: Classroom;
  readonly study: Study;
}

/** A class with its study; null when either is not here, or no more. */
export function useClass(id: string): Result<ClassOfStudy | null> | undefined {
  return useServices().useStored<ClassOfStudy | null>(
    async (store) => {
      const classroom = await store.classroom(id);
      if (!classroom.ok) return classroom;
      if (classroom.value === null || classroom.value.removed) return { ok: true, value: null };
      const study = await store.study(classroom.value.study);
      if (!study.ok) return study;
      if (study.value === null || study.value.removed) return { ok: true, value: null };
      return { ok: true, value: { classroom: classroom.value, study: study.value } };
    },
    [id],
  );
}
