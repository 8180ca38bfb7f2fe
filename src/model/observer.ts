import * as z from 'zod/mini';
import { id, revision, shortText } from './common.ts';

/**
 * What a key of a keyboard or page-turner can do in the room. `code:1` is the first code of the set; the last three
 * are for headcounts.
 */
export const keyAction = z
  .string()
  .check(
    z.regex(
      /^(code:[1-6]|cannot see|nothing|child before|undo|silence|flag|cover|one more|one fewer|same again)$/,
    ),
  );
export type KeyAction = z.infer<typeof keyAction>;

export const keyMap = z.object({ on: z.boolean(), keys: z.record(z.string(), keyAction) });
export type KeyMap = z.infer<typeof keyMap>;

/** How an observer likes the room to be. */
export const manner = z.object({
  /** `plan`: the seating plan in the middle, codes at the edges. `eyes-up`: large fixed places, worked without looking. */
  layout: z.enum(['plan', 'eyes-up']),
  hand: z.enum(['right', 'left']),
  /** A low click in the earpiece and a short vibration for each mark, different for each code. */
  confirm: z.boolean(),
  /** A prompt that is not answered yet is felt and heard once more before its interval is lost. */
  remind: z.boolean(),
});
export type Manner = z.infer<typeof manner>;

export const observer = z.object({
  id,
  study: id,
  /** A working name or initials, chosen by the team. */
  name: shortText,
  keyMap: z.nullable(keyMap),
  manner: z.optional(manner),
  removed: z.boolean(),
  revision,
});
export type Observer = z.infer<typeof observer>;
