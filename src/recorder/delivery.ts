import type { CueCarrier, EntryBody } from '../journal/entry.ts';
import type { GridCue } from './grid.ts';

/** A visual cue that comes later than this is not that cue any more: it is never shown afterwards. */
export const shownWithinMs = 1000;

export interface Carriers {
  /** The sound lay on the audio clock and that clock has run past it. */
  readonly heard: boolean;
  /** By so many milliseconds what was heard came later than planned: a slip of the audio clock that was just found. */
  readonly late: number;
  /** The page is seen, and nothing hid it since the cue. */
  readonly seen: boolean;
  /** Makes the tablet vibrate; false when it cannot or is not asked to. */
  readonly vibrate: () => boolean;
}

/**
 * What the journal says of a cue at the first wake-up after it. Sound comes at the planned moment, exactly, but
 * for a slip of the audio clock; screen and vibration come with the wake-up, and only when that is soon enough.
 */
export function delivered(
  cue: GridCue,
  now: number,
  carriers: Carriers,
): Extract<EntryBody, { kind: 'cued' }> {
  const soon = carriers.seen && now - cue.at <= shownWithinMs;
  const by: CueCarrier[] = [];
  if (carriers.heard) by.push('sound');
  if (soon) by.push('screen');
  if (soon && carriers.vibrate()) by.push('vibration');
  return {
    kind: 'cued',
    interval: cue.interval,
    cue: cue.cue,
    planned: cue.at,
    delivered: carriers.heard ? Math.round(cue.at + carriers.late) : soon ? Math.round(now) : null,
    by,
  };
}

/** A stretch during which the page was hidden or the sound stuck, as the journal tells it. */
export interface Stretch {
  readonly from: number;
  readonly to: number;
}

/**
 * The part of a stretch in which cues came to nobody: from the first lost cue to the next one that was delivered, or to
 * the end of the stretch. Without a lost cue it has no length: it is written down and makes nothing missing.
 */
export function lostStretch(
  cues: readonly { readonly at: number; readonly lost: boolean }[],
  stretch: Stretch,
): Stretch {
  const first = cues.findIndex((cue) => cue.lost);
  if (first < 0) return { from: stretch.to, to: stretch.to };
  const last = cues.findLastIndex((cue) => cue.lost);
  return { from: cues[first]?.at ?? stretch.from, to: cues[last + 1]?.at ?? stretch.to };
}
