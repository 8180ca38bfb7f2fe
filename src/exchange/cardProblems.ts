import type { Problem } from '../kernel/result.ts';

type None = Record<never, never>;

/** Every sentence about pairing cards and the values of its gaps; `words/<language>/pairing.ts` has one for each. */
export interface CardProblemValues {
  /** A picture without a code. */
  'card.noCode': { name: string };
  /** A file that is no picture. */
  'card.noPicture': { name: string };
  /** A text, or a code in a picture, that is no pairing card. */
  'card.otherCode': { found: string };
  'card.newer': { version: number; known: number };
  'card.cutOff': None;
  'card.damaged': None;
  /** A line of the text that is to be typed. */
  'card.line': { line: number; found: string };
  'card.otherCard': None;
  /** The numbers of the pictures, joined by commas. */
  'card.missing': { missing: string; of: number };
  'card.tooLarge': { pictures: number; most: number };
}

export type CardProblemCode = keyof CardProblemValues;

/** A refusal about a card. */
export function cardProblem<Code extends CardProblemCode>(
  code: Code,
  values: CardProblemValues[Code],
): { readonly ok: false; readonly problem: Problem<Code> } {
  return { ok: false, problem: { code, values: values as Problem['values'] } };
}
