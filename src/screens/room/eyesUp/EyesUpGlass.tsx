import type { ReactNode } from 'react';
import { Button } from '../../../ui/Button.tsx';
import { useCoreWords } from '../../coreServices.ts';
import { HoldLine } from '../HoldLine.tsx';
import { LookAt } from '../LookAt.tsx';
import { Ribbon } from '../Ribbon.tsx';
import { KeptSign } from '../TopRow.tsx';
import { ZoneTargets } from './ZoneTargets.tsx';
import type { Zones } from './zones.ts';
import './eyesUp.css';

interface Props {
  /** null while nothing can be marked. */
  readonly zones: Zones | null;
  /** Nobody is to be looked at now. */
  readonly still: boolean;
  /** What lies over the places; null for nothing. */
  readonly middle: ReactNode;
  readonly leaving: number;
  readonly onLeave: () => void;
}

/** The layout that is worked without looking: one thin line for the eyes, and places that never move. */
export function EyesUpGlass({ zones, still, middle, leaving, onLeave }: Props) {
  const { room } = useCoreWords();
  return (
    <>
      <header className="eyes-up-top">
        {!still && <LookAt />}
        <Ribbon />
        <KeptSign />
        <Button look="quiet" className="eyes-up-leave" onClick={onLeave}>
          {room.leaveEyesUp}
        </Button>
      </header>
      {zones !== null && <ZoneTargets zones={zones} />}
      <div className="eyes-up-over">
        <HoldLine leaving={leaving} />
        {middle}
      </div>
    </>
  );
}
