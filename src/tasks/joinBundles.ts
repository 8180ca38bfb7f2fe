import { mergeBundles } from '../exchange/mergeBundles.ts';
import type { Bundle, Merged } from '../exchange/types.ts';
import type { Classroom } from '../model/classroom.ts';
import type { StudyBundle } from './ports.ts';

/** Joins states of one study and says what people should know of it. */
export function mergeStates(states: readonly StudyBundle[]): {
  bundle: StudyBundle;
  notices: Merged['notices'];
} {
  const [first] = states;
  if (first === undefined) throw new RangeError('nothing to join');
  const merged = mergeBundles(states.map(toBundle));
  const { classes, observers, protocols, sessions } = merged.bundle;
  const study = merged.bundle.study ?? first.study;
  return {
    bundle: { study, classes: withdrawnStayOut(classes, states), observers, protocols, sessions },
    notices: merged.notices,
  };
}

/** What the store joins with when files come in. */
export const joinBundles = (kept: StudyBundle, incoming: StudyBundle): StudyBundle =>
  mergeStates([kept, incoming]).bundle;

export const toBundle = (state: StudyBundle): Bundle => ({
  study: state.study,
  classes: [...state.classes],
  observers: [...state.observers],
  protocols: [...state.protocols],
  sessions: [...state.sessions],
  visitPlans: [],
});

/**
 * Of a class the newer state counts as a whole, but a child that was withdrawn in any of them stays withdrawn: consent
 * that was taken back on one tablet is not given again by an edit on another.
 */
function withdrawnStayOut(classes: readonly Classroom[], states: readonly StudyBundle[]): Classroom[] {
  const withdrawn = new Set(
    states.flatMap((state) =>
      state.classes.flatMap((one) => one.children.flatMap((child) => (child.removed ? [child.id] : []))),
    ),
  );
  return classes.map((one) => {
    if (!one.children.some((child) => withdrawn.has(child.id) && !child.removed)) return one;
    const children = one.children.map((child) =>
      withdrawn.has(child.id) ? { ...child, removed: true } : child,
    );
    const seats = one.plan?.seats.map((seat) =>
      seat.child !== null && withdrawn.has(seat.child) ? { ...seat, child: null } : seat,
    );
    return { ...one, children, plan: one.plan === null ? null : { ...one.plan, seats: seats ?? [] } };
  });
}
