import type { Manner } from './observer.ts';

/** How the room is for an observer who has chosen nothing. */
export const usualManner: Manner = { layout: 'plan', hand: 'right', confirm: true, remind: false };
