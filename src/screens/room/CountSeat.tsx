import { useRef } from 'react';
import { sameTargetMs } from '../../recorder/doubleTouch.ts';
import type { SeatLook } from '../plan/PlanView.tsx';
import { useCounting } from './Counting.tsx';
import { useTouchDown } from './useTouchDown.ts';

/** A child's seat in a headcount: a touch counts the child as on-task, another one no longer. */
export function CountSeat({ child, look }: { readonly child: string; readonly look: SeatLook }) {
  const { count, step } = useCounting();
  const last = useRef(Number.NEGATIVE_INFINITY);
  const ref = useTouchDown((at) => {
    // A double tap is one touch: it must not take back what it has just counted.
    if (at - last.current < sameTargetMs) return;
    last.current = at;
    step({ kind: 'seat', child }, at);
  });
  const isOn = count.tapped.has(child);
  return (
    <button
      ref={ref}
      type="button"
      {...look}
      className={`${look.className} seat-count ${isOn ? 'seat-counted' : ''}`}
      aria-pressed={isOn}
    />
  );
}
