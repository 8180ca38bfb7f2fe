import { useMemo, useRef, useState } from 'react';
import type { Problem } from '../../kernel/result.ts';
import { type PaperAnswer, type PaperDraft, type PaperOnset, savePaper } from '../../tasks/index.ts';
import { useServices } from '../services.ts';
import { keepLatest } from './keepLatest.ts';

export interface Typing {
  readonly draft: PaperDraft;
  /** Changes the head of the sheet; kept, and not a step of undo. */
  readonly change: (changes: Partial<PaperDraft>) => void;
  /** undefined empties the line. */
  readonly answer: (interval: number, answer: PaperAnswer | undefined) => void;
  readonly onsets: (onsets: readonly PaperOnset[]) => void;
  /** Takes the last line typed back; null when there is none. */
  readonly undo: (() => { readonly interval: number | null }) | null;
  readonly kept: 'kept' | 'keeping' | Problem;
  readonly settled: () => Promise<void>;
}

interface Step {
  readonly before: Pick<PaperDraft, 'answers' | 'onsets'>;
  readonly interval: number | null;
}

/** The sheet as it is being typed: each change is kept on the tablet at once, and each line can be taken back. */
export function useTyping(first: PaperDraft): Typing {
  const { deps } = useServices();
  const [draft, setDraft] = useState(first);
  const [steps, setSteps] = useState<readonly Step[]>([]);
  const [kept, setKept] = useState<Typing['kept']>('kept');
  // What several keys within one rendering build on.
  const latest = useRef(first);
  const keeper = useMemo(
    () =>
      keepLatest<PaperDraft>(
        (value) => savePaper(deps, value),
        (answer, more) => setKept(!answer.ok ? answer.problem : more ? 'keeping' : 'kept'),
      ),
    [deps],
  );
  const change = (changes: Partial<PaperDraft>): void => {
    latest.current = { ...latest.current, ...changes };
    setDraft(latest.current);
    setKept('keeping');
    keeper.put(latest.current);
  };
  const step = (changes: Partial<Step['before']>, interval: number | null): void => {
    const { answers, onsets } = latest.current;
    setSteps((past) => [...past, { before: { answers, onsets }, interval }]);
    change(changes);
  };
  const last = steps.at(-1);
  return {
    draft,
    change,
    answer: (interval, answer) => {
      const { [interval]: _, ...others } = latest.current.answers;
      step({ answers: answer === undefined ? others : { ...others, [interval]: answer } }, interval);
    },
    onsets: (onsets) => step({ onsets }, null),
    undo:
      last === undefined
        ? null
        : () => {
            setSteps((past) => past.slice(0, -1));
            change(last.before);
            return { interval: last.interval };
          },
    kept,
    settled: () => keeper.settled(),
  };
}
