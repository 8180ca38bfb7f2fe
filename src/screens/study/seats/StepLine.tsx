import type { ReactNode } from 'react';
import { Button } from '../../../ui/Button.tsx';
import { useWords } from '../../services.ts';
import type { PlanEdits } from './usePlanEdits.ts';

/** What to tap now, and the way back from what was tapped last. */
export function StepLine({ edits, children }: { readonly edits: PlanEdits; readonly children: ReactNode }) {
  const { common } = useWords();
  return (
    <div className="seating-step">
      <p role="status">{children}</p>
      <Button disabled={edits.undo === null} onClick={() => edits.undo?.()}>
        {common.undo}
      </Button>
    </div>
  );
}
