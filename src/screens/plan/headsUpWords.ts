import type { HeadsUp } from '../../model/protocol.ts';
import type { SeatingPlan } from '../../model/seatingPlan.ts';
import type { CoreWords } from '../../words/coreWords.ts';
import { seatPlace } from './seatPlace.ts';

interface Lesson {
  readonly children: readonly { readonly id: string; readonly pseudonym: string }[];
  readonly reserves?: readonly { readonly id: string; readonly pseudonym: string }[] | undefined;
  readonly plan: SeatingPlan | null;
}

/**
 * What is spoken ahead of a look: the child's pseudonym as one says it ("Otter 7" for Otter-07), or where it sits, as
 * the observer sees it. Without a seat the pseudonym is said, without a child nothing.
 */
export function headsUpWords(
  says: HeadsUp['says'],
  { children, reserves = [], plan }: Lesson,
  { room }: Pick<CoreWords, 'room'>,
): (look: { readonly child: string | null; readonly seat: string | null }) => string | null {
  const names = new Map([...children, ...reserves].map(({ id, pseudonym }) => [id, pseudonym]));
  return ({ child, seat }) => {
    const place = says === 'seat' && plan !== null && seat !== null ? seatPlace(plan, seat) : null;
    if (place !== null) return room.spokenSeat(place);
    const name = child === null ? undefined : names.get(child);
    return name === undefined ? null : room.spokenChild({ child: name });
  };
}
