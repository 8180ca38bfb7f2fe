import type { Ask } from '../worker/questions.ts';

/** Asks the worker, which is started with the first question: a recording asks none. */
export function startWorker(): Ask {
  let started: Promise<Ask> | null = null;
  const start = async (): Promise<Ask> => {
    const { createAsker } = await import('../worker/client.ts');
    return createAsker(new Worker(new URL('../worker/worker.ts', import.meta.url), { type: 'module' }));
  };
  return async (question, options) => {
    started ??= start();
    return (await started)(question, options);
  };
}
