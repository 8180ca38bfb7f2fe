import { common } from './common.ts';
import { keeping } from './keeping.ts';
import { missing } from './missing.ts';
import { plan } from './plan.ts';
import { recording } from './recording.ts';
import { room } from './room.ts';
import { roomCorrections } from './roomCorrections.ts';
import { roomLayout } from './roomLayout.ts';
import { roomMethods } from './roomMethods.ts';
import { startTogether } from './startTogether.ts';

/** What the recording screen says, and what is said everywhere: loaded before anything else, so it is kept small. */
export const core = {
  common,
  missing,
  problems: { ...keeping, ...recording },
  plan,
  room: { ...room, ...roomMethods, ...roomCorrections, ...roomLayout, ...startTogether },
};
