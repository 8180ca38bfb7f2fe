import type { ProblemValues } from '../../src/exchange/problemValues.ts';
import type { FileProblem } from '../../src/exchange/types.ts';
import { problems } from '../../src/words/en/problems.ts';
import type { Format } from '../../src/words/format.ts';
import { formatFor } from '../../src/words/format.ts';
import { spoken } from '../../src/words/message.ts';
import { say } from '../../src/words/say.ts';

/** The compiler sees to it that every code has its sentence, with these values. */
const catalogue: {
  readonly [Code in keyof ProblemValues]: string | ((values: ProblemValues[Code], f: Format) => string);
} = problems;

const english = spoken(problems, formatFor('en-GB'));

export const codesWithSentences = Object.keys(catalogue);

/** What people read of a problem. */
export function sentence({ problem }: Pick<FileProblem, 'problem'>): string {
  return say(english, problem);
}
