import { useCallback, useLayoutEffect, useRef } from 'react';
import { type PageMs, pageMs } from '../../kernel/units.ts';

/** A click that comes within this time of the finger is the finger's own click. */
const ownClickMs = 700;

/**
 * Acts when a finger goes down (not when it lifts), with the touch's own time; any finger counts, also a second one
 * beside a resting palm. A click without a finger (screen reader, Enter, Space) acts too.
 *
 * React listens to touches passively at the root, so this listens by itself: only then can it keep the browser from
 * zooming, selecting and opening menus.
 *
 * @returns the ref of the target
 */
export function useTouchDown(
  act: (at: PageMs) => void,
): (element: HTMLElement | null) => (() => void) | undefined {
  const latest = useRef(act);
  useLayoutEffect(() => {
    latest.current = act;
  });
  return useCallback((element: HTMLElement | null) => {
    if (element === null) return undefined;
    let finger = Number.NEGATIVE_INFINITY;
    const seen = (event: PointerEvent): void => {
      finger = event.timeStamp;
    };
    const down = (event: PointerEvent): void => {
      event.preventDefault();
      seen(event);
      if (event.button === 0) latest.current(pageMs(event.timeStamp));
    };
    const click = (event: MouseEvent): void => {
      if (event.timeStamp - finger > ownClickMs) latest.current(pageMs(event.timeStamp));
    };
    const nothing = (event: Event): void => event.preventDefault();
    element.addEventListener('pointerdown', down);
    element.addEventListener('pointerup', seen);
    element.addEventListener('pointercancel', seen);
    element.addEventListener('click', click);
    element.addEventListener('touchstart', nothing, { passive: false });
    element.addEventListener('contextmenu', nothing);
    return () => {
      element.removeEventListener('pointerdown', down);
      element.removeEventListener('pointerup', seen);
      element.removeEventListener('pointercancel', seen);
      element.removeEventListener('click', click);
      element.removeEventListener('touchstart', nothing);
      element.removeEventListener('contextmenu', nothing);
    };
  }, []);
}
