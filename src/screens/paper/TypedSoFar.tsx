import { HeldButton } from '../../ui/HeldButton.tsx';
import { say } from '../../words/say.ts';
import { useWords } from '../services.ts';
import type { Typing } from './useTyping.ts';

interface Props {
  readonly typing: Typing;
  readonly onUndo: () => void;
  /** How much of the sheet is typed. */
  readonly progress: string;
}

/** The way back from the line typed last, how far the sheet is, and whether that is kept. */
export function TypedSoFar({ typing: { undo, kept }, onUndo, progress }: Props) {
  const { paper, problems } = useWords();
  const state = kept === 'kept' ? paper.keptSoFar : kept === 'keeping' ? paper.keeping : say(problems, kept);
  return (
    <>
      <HeldButton look="quiet" why={undo === null ? paper.undoNothing : null} onClick={onUndo}>
        {paper.undo}
      </HeldButton>
      <span className="second small grow" role="status">
        {progress}, {state}
      </span>
    </>
  );
}
