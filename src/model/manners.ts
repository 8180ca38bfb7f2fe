import type { Manner } from './observer.ts';

/** How the room is for an observer who has chosen nothing. */
export const usualManner: Manner = { layout: 'plan', hand: 'right', confirm: true, remind: false };

/** The manner after a change. Eyes-up begins with prompts recalled: nobody sees there that a look still waits. */
export function changedManner(manner: Manner, changes: Partial<Manner>): Manner {
  const begins = changes.layout === 'eyes-up' && manner.layout !== 'eyes-up';
  return { ...manner, ...(begins ? { remind: true } : {}), ...changes };
}
