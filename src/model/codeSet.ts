import * as z from 'zod/mini';
import { id, longText, shortText } from './common.ts';

/** How a code counts: towards on-task, towards off-task, or neither (it is recorded and left out of percent on-task). */
export const codeRoles = ['on-task', 'off-task', 'other'] as const;
export const codeRole = z.enum(codeRoles);
export type CodeRole = z.infer<typeof codeRole>;

export const code = z.object({
  id,
  label: shortText,
  role: codeRole,
  definition: longText,
  examples: longText,
  nonExamples: longText,
});
export type Code = z.infer<typeof code>;

/** The codes in the order in which they stand at the edges of the screen and in tables. */
export const codeSet = z.object({
  name: shortText,
  codes: z.array(code).check(z.minLength(1), z.maxLength(200)),
});
export type CodeSet = z.infer<typeof codeSet>;

/** Name of a code set that holds no more than the labels that a table used; a team's own set never has it. */
export const labelsOfTable = '(labels of a table)';
