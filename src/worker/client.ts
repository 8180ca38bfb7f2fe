import { type Endpoint, proxy, wrap } from 'comlink';
import { problem } from '../kernel/result.ts';
import type { Answer, Ask, Question, QuestionKind } from './questions.ts';
import type { Desk } from './serve.ts';

export { askDirectly } from './askDirectly.ts';

/** Asks a worker (or whatever stands at the other end of an endpoint). */
export function createAsker(worker: Endpoint): Ask {
  const desk = wrap<Desk>(worker);
  let asked = 0;
  return <Kind extends QuestionKind>(
    question: Question<Kind>,
    { signal, progress }: { signal?: AbortSignal; progress?: (share: number) => void } = {},
  ): Promise<Answer<Kind>> => {
    if (signal?.aborted) return Promise.resolve(problem('ask.stopped'));
    asked += 1;
    const number = asked;
    const answer = desk.ask(
      number,
      question as Question,
      progress === undefined ? null : proxy(progress),
    ) as Promise<Answer<Kind>>;
    if (signal === undefined) return answer;
    return new Promise((resolve, reject) => {
      const stop = (): void => {
        void desk.stop(number);
        resolve(problem('ask.stopped'));
      };
      signal.addEventListener('abort', stop, { once: true });
      answer.then(resolve, reject).finally(() => signal.removeEventListener('abort', stop));
    });
  };
}
