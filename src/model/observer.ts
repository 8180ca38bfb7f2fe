import * as z from 'zod/mini';
import { id, revision, shortText } from './common.ts';

/** What a key of a keyboard or page-turner can do in the room. `code:1` is the first code of the set. */
export const keyAction = z
  .string()
  .check(z.regex(/^(code:[1-6]|cannot see|nothing|child before|undo|silence|flag)$/));
export type KeyAction = z.infer<typeof keyAction>;

export const keyMap = z.object({ on: z.boolean(), keys: z.record(z.string(), keyAction) });
export type KeyMap = z.infer<typeof keyMap>;

export const observer = z.object({
  id,
  study: id,
  /** A working name or initials, chosen by the team. */
  name: shortText,
  keyMap: z.nullable(keyMap),
  removed: z.boolean(),
  revision,
});
export type Observer = z.infer<typeof observer>;
