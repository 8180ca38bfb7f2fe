import { createContext, useContext } from 'react';
import type { Result } from '../../kernel/result.ts';
import { usualManner } from '../../model/manners.ts';
import type { Manner } from '../../model/observer.ts';
import { useCoreWords } from '../coreServices.ts';
import { useFacts } from './RoomFacts.tsx';

interface MannerOfObserver {
  readonly manner: Manner;
  /** Changes it at once and keeps it for the observer. */
  readonly change: (manner: Manner) => void;
  /** How the last keeping went; null before it, and once that was seen. */
  readonly kept: Result<unknown> | null;
  readonly seen: () => void;
}

const nothing = (): void => undefined;

export const MannerContext = createContext<MannerOfObserver>({
  manner: usualManner,
  change: nothing,
  kept: null,
  seen: nothing,
});

/** How the observer of this session likes the room to be. */
export function useManner(): MannerOfObserver {
  return useContext(MannerContext);
}

/** Whether the glass is laid out eyes-up: the observer wants it, and the code set has a place for each target. */
export function useEyesUp(): boolean {
  const { zones } = useFacts();
  return useManner().manner.layout === 'eyes-up' && zones !== null;
}

/** Why an observer who wants eyes-up cannot have it in this session; null for all others. */
export function useWhyNoEyesUp(): string | null {
  const { room } = useCoreWords();
  const { method, zones } = useFacts();
  const { layout } = useManner().manner;
  if (layout !== 'eyes-up' || zones !== null) return null;
  return method === 'headcount' ? room.eyesUpNotCount : room.eyesUpNot;
}

/** What an edge of the glass is called: the observer's hand decides where it is. */
export function useEdgeLabel(side: 'left' | 'right'): string {
  const { room } = useCoreWords();
  const isLeft = (side === 'left') === (useManner().manner.hand === 'right');
  return isLeft ? room.codesLeft : room.codesRight;
}
