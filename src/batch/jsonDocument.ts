import { say } from '../words/say.ts';
import type { Words } from '../words/words.ts';

/**
 * A report as the document that is printed: full precision, nulls with a sentence in `why`; a `why` without an
 * entry is left out.
 */
export function jsonDocument(report: unknown, words: Words): string {
  return `${JSON.stringify(withSentences(report, words), null, 2)}\n`;
}

function withSentences(value: unknown, words: Words): unknown {
  if (Array.isArray(value)) return value.map((one) => withSentences(one, words));
  if (value === null || typeof value !== 'object') return value;
  return Object.fromEntries(
    Object.entries(value).flatMap(([key, member]) => {
      if (key !== 'why') return [[key, withSentences(member, words)]];
      const reasons = Object.entries(member as Record<string, string>);
      if (reasons.length === 0) return [];
      return [
        [key, Object.fromEntries(reasons.map(([field, code]) => [field, whySentence(field, code, words)]))],
      ];
    }),
  );
}

/** "kappa is undefined: both observers used one code only" */
export function whySentence(field: string, code: string, words: Words): string {
  const figure = say(words.figures, { code: field, values: {} });
  return words.why.undefinedFigure({ figure, reason: say(words.why, { code, values: {} }) });
}
