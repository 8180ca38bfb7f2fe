import type { SessionHeader } from '../../model/session.ts';
import type { LiveOptions } from '../../recorder/liveSession.ts';
import type { CoreWords } from '../../words/coreWords.ts';
import { turned } from '../plan/turned.ts';

/**
 * What is spoken ahead of a look: the child's pseudonym as one says it ("Otter 7" for Otter-07), or where the child
 * sits, seen from the observer: the nearest row is the first, places count from the left. Without a seat the pseudonym
 * is said, without a child nothing.
 */
export function headsUpWords(
  header: SessionHeader,
  { room }: Pick<CoreWords, 'room'>,
): NonNullable<LiveOptions['headsUp']> {
  const { schedule } = header;
  const says = schedule.kind === 'laid' ? schedule.protocol.cues.headsUp?.says : undefined;
  const seats = header.plan === null ? null : turned(header.plan);
  const names = new Map(
    [...header.children, ...(header.reserves ?? [])].map(({ id, pseudonym }) => [id, pseudonym]),
  );
  return ({ child, seat }) => {
    const found = says === 'seat' ? seats?.seats.find(({ id }) => id === seat) : undefined;
    if (found !== undefined && seats !== null)
      return room.spokenSeat({ row: seats.rows - found.y, place: found.x + 1 });
    const name = child === null ? undefined : names.get(child);
    return name === undefined ? null : name.replace(/[-_ ]+0*(?=\d)/g, ' ');
  };
}
