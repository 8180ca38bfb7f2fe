import { useCoreWords } from '../coreServices.ts';
import { Look } from './Look.tsx';
import { useFacts } from './RoomFacts.tsx';
import { useRoom } from './useRoom.ts';

/** The one child who is watched, what is in force, and since when. Where nothing is, it is said. */
export function DurationLook() {
  const { room, missing } = useCoreWords();
  const { pseudonyms, codes } = useFacts();
  const s = useRoom(({ current, away }) => ({
    child: current?.child ?? null,
    status: current?.status ?? 'open',
    code: current?.codes?.[0] ?? null,
    missing: current?.missing ?? null,
    away: current?.child == null ? null : (away.get(current.child) ?? null),
    since: Math.floor((current?.openAt ?? 0) / 1000) * 1000,
  }));
  const label = s.code === null ? room.noneOfThese : (codes.get(s.code)?.code.label ?? s.code);
  const what =
    s.status === 'scored'
      ? room.inForce({ what: label, since: s.since })
      : s.away !== null
        ? room.awayNow({ reason: missing[s.away] })
        : s.missing === null || s.missing === 'missed'
          ? room.nothingInForce
          : room.inForce({
              what: s.missing === 'out of view' ? room.cannotSee : missing[s.missing],
              since: s.since,
            });
  return (
    <Look lead={room.watch} then={s.status === 'scored' ? what : <strong>{what}</strong>}>
      {s.child === null ? room.everyone : (pseudonyms.get(s.child) ?? room.everyone)}
    </Look>
  );
}
