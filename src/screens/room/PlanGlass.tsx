import type { ReactNode } from 'react';
import { HoldLine } from './HoldLine.tsx';
import { LessonPlan } from './LessonPlan.tsx';
import { LookAt } from './LookAt.tsx';
import { Standstill } from './Standstill.tsx';
import { Targets } from './Targets.tsx';
import { TopRow } from './TopRow.tsx';

interface Props {
  /** A touch can mark something. */
  readonly marking: boolean;
  /** Nobody is to be looked at now. */
  readonly still: boolean;
  /** What stands beside the seating plan (below it on upright glass); null for nothing. */
  readonly panel: ReactNode;
  readonly leaving: number;
}

/** The ordinary layout: the seating plan in the middle, the targets at both edges. */
export function PlanGlass({ marking, still, panel, leaving }: Props) {
  return (
    <>
      <TopRow />
      {marking && <Targets side="left" />}
      <div className="room-centre">
        {!still && <LookAt />}
        <div className="room-middle">{still && panel === null ? <Standstill /> : <LessonPlan />}</div>
        {panel}
        <HoldLine leaving={leaving} />
      </div>
      {marking && <Targets side="right" />}
    </>
  );
}
