import type { Problem } from '../kernel/result.ts';

/**
 * The sentence for a `{ code, values }` of a pure floor, from one area of the catalogue. A code without a sentence
 * is shown as it is, so that nothing is ever swallowed.
 */
export function say(area: object, { code, values }: Pick<Problem, 'code' | 'values'>): string {
  const message = (area as Record<string, unknown>)[code];
  if (typeof message === 'string') return message;
  if (typeof message === 'function') return (message as (values: Problem['values']) => string)(values);
  return code;
}
