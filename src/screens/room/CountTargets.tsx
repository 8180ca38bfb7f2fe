import { useMemo } from 'react';
import type { KeyAction } from '../../model/observer.ts';
import { useCoreWords } from '../coreServices.ts';
import { useCounting } from './Counting.tsx';
import { type CountStep, counted } from './countSteps.ts';
import { CannotSee } from './Edge.tsx';
import { useFacts } from './RoomFacts.tsx';
import { Target } from './Target.tsx';
import { useEdgeLabel } from './useManner.ts';
import { useRoom } from './useRoom.ts';

/** A headcount's targets: whole answers on the left, steps on the right. Each says what the figure becomes. */
export function CountTargets({ side }: { readonly side: 'left' | 'right' }) {
  const { room } = useCoreWords();
  const label = useEdgeLabel(side);
  const seated = useSeated();
  if (side === 'left')
    return (
      <section className="edge edge-left" aria-label={label}>
        <Step sign="all" step={{ kind: 'all', seated }} label={room.allOnTask} />
        <Step sign="same" step={{ kind: 'same' }} label={room.sameAgain} action="same again" />
        <Step sign="nobody" step={{ kind: 'nobody' }} label={room.nobodyOnTask} />
      </section>
    );
  return (
    <section className="edge edge-right" aria-label={label}>
      <Step sign="more" step={{ kind: 'more' }} label={room.oneMore} action="one more" />
      <Step sign="fewer" step={{ kind: 'fewer' }} label={room.oneFewer} action="one fewer" />
      <CannotSee />
    </section>
  );
}

/** Children who have a seat and are there. */
function useSeated(): readonly string[] {
  const { header } = useFacts();
  const away = useRoom((s) => s.away);
  const seats = useRoom((s) => s.seats);
  return useMemo(
    () => header.children.map(({ id }) => id).filter((id) => seats.has(id) && !away.has(id)),
    [header, away, seats],
  );
}

const signs = {
  more: 'M17 6V28M6 17H28',
  fewer: 'M6 17H28',
  all: 'M7 27V15M13.7 27V11M20.3 27V11M27 27V15',
  same: 'M7 12H27M7 22H27',
  nobody: 'M8 8H26V26H8Z',
};

interface StepProps {
  readonly sign: keyof typeof signs;
  readonly step: CountStep;
  readonly label: string;
  readonly action?: KeyAction;
}

function Step({ sign, step, label, action }: StepProps) {
  const { room } = useCoreWords();
  const counting = useCounting();
  const { count } = counting;
  const next = counted(count, step);
  const whole = step.kind === 'nobody' || step.kind === 'all' || step.kind === 'same';
  return (
    <Target
      className={sign === 'more' ? 'target-step target-large' : 'target-step'}
      sign={
        <svg width="34" height="34" viewBox="0 0 34 34" aria-hidden="true">
          <path className="step-sign" d={signs[sign]} />
        </svg>
      }
      chosen={whole && next !== null && count.on === next.on}
      {...(action === undefined ? {} : { action })}
      onTouch={(at) => counting.step(step, at)}
    >
      {label}
      <span className="target-hint">
        {next?.on != null ? room.becomes({ on: next.on }) : step.kind === 'same' ? room.noLastTime : ''}
      </span>
    </Target>
  );
}
