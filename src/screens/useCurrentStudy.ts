import type { Study } from '../model/study.ts';
import type { Settings } from '../tasks/ports.ts';
import { useCoreServices } from './coreServices.ts';

/** The settings as they stand; undefined while they are being read. */
export function useSettings(): Settings | undefined {
  const answer = useCoreServices().useStored((store) => store.settings(), []);
  return answer?.ok ? answer.value : undefined;
}

/** The study that the screens show: null when there is none yet, undefined while it is being read. */
export function useCurrentStudy(): Study | null | undefined {
  const answer = useCoreServices().useStored(async (store) => {
    const settings = await store.settings();
    if (!settings.ok) return settings;
    if (settings.value.study !== null) {
      const chosen = await store.study(settings.value.study);
      if (!chosen.ok || (chosen.value !== null && !chosen.value.removed)) return chosen;
    }
    const all = await store.studies();
    return all.ok ? { ok: true as const, value: all.value[0] ?? null } : all;
  }, []);
  return answer === undefined ? undefined : answer.ok ? answer.value : null;
}
