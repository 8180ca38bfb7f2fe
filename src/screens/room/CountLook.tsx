import { useCoreWords } from '../coreServices.ts';
import { useCounting } from './Counting.tsx';
import type { CountStep } from './countSteps.ts';
import { Look } from './Look.tsx';
import { useRoom } from './useRoom.ts';
import { useTouchDown } from './useTouchDown.ts';

/** The figure of this scan, and beside it the number of those present with its own small steps. */
export function CountLook() {
  const { room } = useCoreWords();
  const { count } = useCounting();
  const notSeen = useRoom((s) => s.current?.status === 'missing');
  return (
    <Look lead={room.howMany} then={<Present />}>
      {count.on === null && !notSeen && <span className="visually-hidden">{`${room.countNone} `}</span>}
      {notSeen ? room.notSeen : room.countOf(count)}
    </Look>
  );
}

function Present() {
  const { room } = useCoreWords();
  const { present } = useCounting().count;
  return (
    <span className="present">
      <SmallStep step={{ kind: 'gone' }} label={room.presentFewer} sign="M4 10H16" />
      <span className="present-figure">{room.present({ present })}</span>
      <SmallStep step={{ kind: 'arrived' }} label={room.presentMore} sign="M10 4V16M4 10H16" />
    </span>
  );
}

interface StepProps {
  readonly step: CountStep;
  readonly label: string;
  readonly sign: string;
}

function SmallStep({ step, label, sign }: StepProps) {
  const counting = useCounting();
  const ref = useTouchDown((at) => counting.step(step, at));
  return (
    <button ref={ref} type="button" className="present-step" aria-label={label}>
      <svg width="20" height="20" viewBox="0 0 20 20" aria-hidden="true">
        <path className="step-sign" d={sign} />
      </svg>
    </button>
  );
}
