import { useState } from 'react';
import { epochOf } from '../../../kernel/wallTime.ts';
import type { TickChecked } from '../../../tasks/ports.ts';
import { useCoreServices } from '../../coreServices.ts';
import { useSettings } from '../../useCurrentStudy.ts';

/** What the tick check of this visit found, and how to keep another one: on the tablet, since a page may be left before Start. */
export function useTickChecked(visit: string): {
  readonly checked: { readonly nudgeMs: number; readonly agoMs: number } | null;
  readonly keep: (nudgeMs: number) => void;
} {
  const { store, device } = useCoreServices();
  const stored = useSettings()?.tickChecked ?? null;
  // Shown at once, and also where the tablet refuses to keep it.
  const [here, setHere] = useState<TickChecked | null>(null);
  const found = here ?? (stored?.visit === visit ? stored : null);
  const agoMs = found === null ? Number.NaN : epochOf(device.now().wall) - epochOf(found.wall);
  return {
    // A check in the future: the clock was set back since, so that its nudge says nothing any more.
    checked: found !== null && agoMs >= 0 ? { nudgeMs: found.nudgeMs, agoMs } : null,
    keep: (nudgeMs) => {
      const now: TickChecked = { visit, nudgeMs, wall: device.now().wall };
      setHere(now);
      void store.saveSettings({ tickChecked: now });
    },
  };
}
