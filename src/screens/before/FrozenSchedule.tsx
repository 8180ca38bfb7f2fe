import { useMemo } from 'react';
import type { VisitPlan } from '../../model/visitPlan.ts';
import { Sheet } from '../../ui/Sheet.tsx';
import { SchedulePicture } from '../schedule/SchedulePicture.tsx';
import { useServices } from '../services.ts';

/** The schedule of a prepared visit as it stands: whose look comes when. */
export function FrozenSchedule({ plan }: { readonly plan: VisitPlan }) {
  const { words } = useServices();
  const watched = useMemo(
    () => plan.children.map(({ id, pseudonym }) => ({ id, label: pseudonym })),
    [plan.children],
  );
  const { protocol, phases, turns } = plan.schedule;
  return (
    <Sheet title={words.before.scheduleTitle}>
      <SchedulePicture protocol={protocol} phases={phases} watched={watched} turns={turns} />
    </Sheet>
  );
}
