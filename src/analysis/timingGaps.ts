import type { GapCause } from '../journal/entry.ts';
import type { JournalState } from '../journal/state.ts';
import { shiftedWall } from '../kernel/wallTime.ts';

/** A stretch in which the tablet did not run as it should. */
export interface TimingGap {
  /** Session ms; equal where no prompt was lost in it. */
  readonly from: number;
  readonly to: number;
  /** The tablet's clock when it began. */
  readonly wall: string;
  readonly cause: GapCause;
  readonly estimated: boolean;
}

/** The gaps of a session in the order in which they were written down. */
export function timingGaps({ entries }: Pick<JournalState, 'entries'>): TimingGap[] {
  return entries.flatMap((entry): TimingGap[] => {
    if (entry.kind !== 'gap') return [];
    const { from, to, cause, estimated, at, wall } = entry;
    return [{ from, to, wall: shiftedWall(wall, from - at), cause, estimated }];
  });
}
