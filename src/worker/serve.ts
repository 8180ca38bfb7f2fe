import { type Endpoint, expose } from 'comlink';
import type { Result } from '../kernel/result.ts';
import type { StoreReader } from '../tasks/ports.ts';
import { answerFrom } from './answers.ts';
import type { Answer, Question, QuestionKind } from './questions.ts';

/** What the two sides of a worker say to each other. */
export interface Desk {
  ask(
    number: number,
    question: Question,
    progress: ((share: number) => void | Promise<void>) | null,
  ): Promise<Answer<QuestionKind>>;
  stop(number: number): void;
}

/** Answers questions that come in over an endpoint. The store is opened with the first one, and again if it was closed. */
export function serveQuestions(open: () => Promise<Result<StoreReader>>, endpoint: Endpoint): void {
  let opened: Promise<Result<StoreReader>> | null = null;
  const stopped = new Set<number>();
  const desk: Desk = {
    ask: async (number, question, progress) => {
      opened ??= open();
      const store = await opened;
      if (!store.ok) {
        opened = null;
        return store;
      }
      const answer = await answerFrom(store.value, question, {
        stopped: () => stopped.has(number),
        progress: async (share) => {
          await progress?.(share);
        },
      });
      stopped.delete(number);
      if (!answer.ok && answer.problem.code === 'store.closed') opened = null;
      return answer;
    },
    stop: (number) => {
      stopped.add(number);
    },
  };
  expose(desk, endpoint);
}
