import { type ReactNode, useState } from 'react';
import type { PageMs } from '../../kernel/units.ts';
import { keyOf } from '../../model/keyMap.ts';
import type { KeyAction } from '../../model/observer.ts';
import type { Felt } from '../../recorder/roomSnapshot.ts';
import { useCoreWords } from '../coreServices.ts';
import { useFacts } from './RoomFacts.tsx';
import { useLive, useRoom } from './useRoom.ts';
import { useTouchDown } from './useTouchDown.ts';

interface Props {
  readonly className?: string;
  readonly sign: ReactNode;
  readonly children: ReactNode;
  /** This is what the current interval holds. */
  readonly chosen: boolean;
  /** The key that does the same. */
  readonly action?: KeyAction;
  /** Whether a touch that was taken was this target's. */
  readonly wasFelt?: (felt: Felt) => boolean;
  /** It is about the look before this one, so it waits until there is one. */
  readonly ofBefore?: boolean;
  readonly onTouch: (at: PageMs) => void;
}

/** One very large target: it acts when the finger goes down, and answers in the same frame. */
export function Target(props: Props) {
  const { className = '', sign, children, chosen, action, wasFelt, ofBefore = false, onTouch } = props;
  const ref = useTouchDown(onTouch);
  // Nothing can be marked before the first prompt: it must not look ready. A touch is still answered, by a sentence.
  const waits = useRoom((s) => (ofBefore ? s.previous : s.current) === null);
  return (
    <button
      ref={ref}
      type="button"
      className={`target ${chosen ? 'target-chosen' : ''} ${waits ? 'target-waits' : ''} ${className}`}
      aria-disabled={waits}
      aria-pressed={chosen}
    >
      {wasFelt !== undefined && <FeltMark wasFelt={wasFelt} />}
      <span className="target-sign">{sign}</span>
      <span className="target-label">{children}</span>
      {action !== undefined && <KeyHint action={action} />}
    </button>
  );
}

/** The answer to a touch: a frame that stays for a moment. A later touch replaces it. */
function FeltMark({ wasFelt }: { readonly wasFelt: (felt: Felt) => boolean }) {
  const live = useLive();
  const [old] = useState(() => live.snapshot().felt?.count ?? 0);
  const count = useRoom(({ felt }) => (felt !== null && felt.count > old && wasFelt(felt) ? felt.count : 0));
  return count === 0 ? null : <span key={count} className="target-felt" />;
}

function KeyHint({ action }: { readonly action: KeyAction }) {
  const { room } = useCoreWords();
  const key = keyOf(useFacts().keys, action);
  return key === null ? null : <kbd className="key">{room.key({ key })}</kbd>;
}
