import { useState } from 'react';
import type { Classroom } from '../../../model/classroom.ts';
import { Sheet } from '../../../ui/Sheet.tsx';
import { useWords } from '../../services.ts';
import { DrawNow } from './DrawNow.tsx';
import { Drawn } from './Drawn.tsx';

/** The children to watch: how they are drawn, and who they are. */
export function DrawSheet({ classroom }: { readonly classroom: Classroom }) {
  const { study } = useWords();
  const [lastSeed, setLastSeed] = useState<string | null>(null);
  return (
    <Sheet title={study.draw}>
      {classroom.draw === null ? (
        <DrawNow classroom={classroom} lastSeed={lastSeed} />
      ) : (
        <Drawn classroom={classroom} draw={classroom.draw} onBack={setLastSeed} />
      )}
    </Sheet>
  );
}
