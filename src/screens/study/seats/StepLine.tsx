import type { ReactNode } from 'react';
import { HeldButton } from '../../../ui/HeldButton.tsx';
import { useWords } from '../../services.ts';
import type { PlanEdits } from './usePlanEdits.ts';

/** What to tap now, and the way back from what was tapped last. */
export function StepLine({ edits, children }: { readonly edits: PlanEdits; readonly children: ReactNode }) {
  const { common, study } = useWords();
  return (
    <div className="seating-step">
      <p role="status">{children}</p>
      <span className="row">
        <HeldButton why={edits.undo === null ? study.undoNothing : null} onClick={() => edits.undo?.()}>
          {common.undo}
        </HeldButton>
      </span>
    </div>
  );
}
