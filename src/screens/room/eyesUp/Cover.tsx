import { useState } from 'react';
import { Button } from '../../../ui/Button.tsx';
import { Hold } from '../../../ui/Sign.tsx';
import { useCoreWords } from '../../coreServices.ts';
import { useRoom } from '../useRoom.ts';
import { ZoneTargets } from './ZoneTargets.tsx';
import type { Zones } from './zones.ts';
import './cover.css';

interface Props {
  /** Where marks are possible without words; null where there are too many to be told apart. */
  readonly zones: Zones | null;
  readonly onUncover: () => void;
}

/**
 * A calm picture in place of the lesson: nothing on it can be read by a child who passes. Prompts go on, and marks are
 * still possible at the same places. Two touches at the top uncover; a passing hand makes one.
 */
export function Cover({ zones, onUncover }: Props) {
  const { room } = useCoreWords();
  const [asked, setAsked] = useState(false);
  const refused = useRoom((s) => s.kept.refused !== null);
  return (
    <>
      <h1 className="visually-hidden">{room.covered}</h1>
      {zones === null ? (
        <p className="visually-hidden">{room.coveredKeys}</p>
      ) : (
        <ZoneTargets zones={zones} covered />
      )}
      <div className="cover-top">
        <Button
          className="cover-out"
          aria-label={asked ? room.uncoverAgain : room.uncover}
          onClick={() => (asked ? onUncover() : setAsked(true))}
        >
          <svg width="44" height="24" viewBox="0 0 44 24" aria-hidden="true">
            <circle className={asked ? 'cover-dot cover-dot-full' : 'cover-dot'} cx="12" cy="12" r="7" />
            <circle className="cover-dot" cx="32" cy="12" r="7" />
          </svg>
        </Button>
        {refused && <Hold />}
      </div>
    </>
  );
}
