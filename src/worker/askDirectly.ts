import { problem } from '../kernel/result.ts';
import type { StoreReader } from '../tasks/ports.ts';
import { answerFrom } from './answers.ts';
import type { Ask } from './questions.ts';

/** Answers on the spot, without a worker: for tests, and where a worker cannot be started. */
export function askDirectly(store: StoreReader): Ask {
  return async (question, { signal, progress = () => undefined } = {}) => {
    const stopped = (): boolean => signal?.aborted ?? false;
    if (stopped()) return problem('ask.stopped');
    const answer = await answerFrom(store, question, { stopped, progress });
    return stopped() ? problem('ask.stopped') : answer;
  };
}
