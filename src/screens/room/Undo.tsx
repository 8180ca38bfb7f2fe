import type { ReactNode } from 'react';
import type { RoomSnapshot } from '../../recorder/roomSnapshot.ts';
import { Button } from '../../ui/Button.tsx';
import { CodeSign, Ring } from '../../ui/Sign.tsx';
import { useCoreWords } from '../coreServices.ts';
import { useFacts } from './RoomFacts.tsx';
import { useLive, useRoom } from './useRoom.ts';
import './undo.css';

/** What undo would take back, with whose look it is. A duration record has stretches: its mark is the watched child's. */
function lastDeed({ undo, intervals, current, state }: RoomSnapshot, continuous: boolean) {
  const interval = undo?.interval ?? null;
  const held = interval === null ? undefined : intervals[interval - 1];
  const entry =
    undo?.kind !== 'marked'
      ? undefined
      : state.entries.findLast(({ writer, seq }) => seq === undo.target.seq && writer === undo.target.writer);
  const counts = entry?.kind === 'marked' ? entry.counts : undefined;
  return {
    kind: undo?.kind ?? null,
    code: undo?.code ?? null,
    on: counts?.on ?? null,
    present: counts?.present ?? 0,
    child: undo?.child ?? (continuous ? (current?.child ?? null) : (held?.child ?? null)),
    ofLook: interval !== null || undo?.child != null,
  };
}

/** Says what it would take back: the sign of the mark, or the deed in words, and whose look it was. */
export function Undo() {
  const live = useLive();
  const { room } = useCoreWords();
  const { codes, pseudonyms, unit } = useFacts();
  const undo = useRoom((s) => lastDeed(s, unit === 'time'));
  const what = undo.code === null ? undefined : codes.get(undo.code);
  let sign: ReactNode = null;
  let words = '';
  if (undo.kind === 'missing') sign = <Ring size={18} />;
  else if (what !== undefined) sign = <CodeSign kind={what.sign} size={18} />;
  else if (undo.on !== null) words = room.countSaid({ on: undo.on, present: undo.present });
  else if (undo.kind === 'marked') words = room.noneOfThese;
  else if (undo.kind !== null) words = room.undoKind({ kind: undo.kind });
  const name = undo.child === null || !undo.ofLook ? '' : (pseudonyms.get(undo.child) ?? '');
  return (
    <Button className="rare rare-undo" aria-disabled={undo.kind === null} onClick={() => live.undo()}>
      <svg width="18" height="18" viewBox="0 0 18 18" aria-hidden="true">
        <path className="rare-flag" d="M7 2L2 7L7 12M2 7H11A5 5 0 0 1 11 17H8" />
      </svg>
      <span className="undo-word">{room.undo}</span>
      {undo.kind === null ? (
        <span className="visually-hidden">{room.undoNothing}</span>
      ) : (
        <span className="rare-what">
          {sign}
          {what !== undefined && <span className="visually-hidden">{what.code.label}</span>}
          {undo.kind === 'missing' && <span className="visually-hidden">{room.cannotSee}</span>}
          <span className={words !== '' && name !== '' ? 'rare-deed' : 'rare-who'}>
            {`${words} ${name}`.trim()}
          </span>
        </span>
      )}
    </Button>
  );
}
