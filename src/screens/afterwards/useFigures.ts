import { useState } from 'react';
import { problem, type Result } from '../../kernel/result.ts';
import type { Answer, Question, QuestionKind, Questions } from '../../worker/questions.ts';
import { useServices } from '../services.ts';
import { type Pending, useAnswer } from '../useAnswer.ts';

export interface Figures<Kind extends QuestionKind> {
  readonly pending: Pending<Questions[Kind]['answer']>;
  readonly stopped: boolean;
  readonly stop: () => void;
  readonly again: () => void;
}

/**
 * Asks for figures and asks again when the question or what is kept has changed; long work can be stopped and taken
 * up again. `stamp` stands for what is kept; undefined = not known yet, so nothing is asked.
 */
export function useFigures<Kind extends QuestionKind>(
  question: Question<Kind>,
  stamp: string | undefined,
): Figures<Kind> {
  const { ask } = useServices();
  const [run, setRun] = useState({ n: 0, stopped: false });
  const pending = useAnswer<Questions[Kind]['answer']>(
    (signal, progress): Promise<Result<Questions[Kind]['answer']>> => {
      if (run.stopped) return Promise.resolve(problem('ask.stopped'));
      if (stamp === undefined) return new Promise(() => undefined);
      return ask(question, { signal, progress }) as Promise<Answer<Kind>>;
    },
    JSON.stringify([question, stamp, run]),
  );
  return {
    pending,
    stopped: run.stopped,
    stop: () => setRun(({ n }) => ({ n, stopped: true })),
    again: () => setRun(({ n }) => ({ n: n + 1, stopped: false })),
  };
}
