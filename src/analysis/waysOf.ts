import type { LookMoment, Method } from '../model/protocol.ts';

/** How looks were taken: the method, and at which end of the interval where looks are moments and that is known. */
export interface Way {
  readonly method: Method;
  readonly lookAt: LookMoment | null;
}

/** The different ways of these records, each once, in the order in which they first come. */
export function waysOf(records: readonly { readonly facts: Way }[]): Way[] {
  const ways = new Map<string, Way>();
  for (const { facts } of records) {
    const { method, lookAt } = facts;
    ways.set(`${method} ${lookAt}`, { method, lookAt });
  }
  return [...ways.values()];
}
