import { useCallback } from 'react';
import type { PageMs } from '../../kernel/units.ts';
import type { KeyAction } from '../../model/observer.ts';
import { useCounting } from './Counting.tsx';
import type { CountStep } from './countSteps.ts';
import { useFacts } from './RoomFacts.tsx';
import { useLive } from './useRoom.ts';

/** In a headcount the keys of the first two codes step up and down, so that a page-turner can count. */
const countSteps: Partial<Record<KeyAction, CountStep>> = {
  'one more': { kind: 'more' },
  'code:1': { kind: 'more' },
  'one fewer': { kind: 'fewer' },
  'code:2': { kind: 'fewer' },
  'same again': { kind: 'same' },
  nothing: { kind: 'nobody' },
};

interface Ends {
  /** Some key acted. */
  readonly onKey: () => void;
  /** The key that covers, and uncovers. */
  readonly onCover: () => void;
}

/** What the keys do: the same as the targets and buttons of that name. */
export function useKeyAct({ onKey, onCover }: Ends): (action: KeyAction, at: PageMs) => void {
  const live = useLive();
  const { codes, method, withNone, withBefore } = useFacts();
  const { step } = useCounting();
  return useCallback(
    (action, at) => {
      onKey();
      const counting = method === 'headcount' ? countSteps[action] : undefined;
      if (counting !== undefined) step(counting, at);
      else if (action === 'cover') onCover();
      else if (action === 'cannot see') live.cannotSee(at);
      else if (action === 'child before') {
        if (withBefore) live.childBefore();
      } else if (action === 'undo') live.undo();
      else if (action === 'flag') live.flag();
      else if (action === 'silence') live.silence(live.snapshot().sound.on);
      else if (method === 'headcount') return;
      else if (action === 'nothing') {
        if (withNone) live.touch(null, at);
      } else {
        const code = [...codes.keys()][Number(action.slice('code:'.length)) - 1];
        if (code !== undefined) live.touch(code, at);
      }
    },
    [live, codes, method, withNone, withBefore, step, onKey, onCover],
  );
}
