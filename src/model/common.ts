import * as z from 'zod/mini';

/** Text that people typed: trimmed length 1 to 200. */
export const shortText = z.string().check(z.minLength(1), z.maxLength(200));
export const longText = z.string().check(z.maxLength(10_000));
export const id = z.string().check(z.minLength(1), z.maxLength(64));
export const whole = z.int().check(z.minimum(0));
export const isoDate = z.string().check(z.regex(/^\d{4}-\d{2}-\d{2}$/));
export const wallTime = z
  .string()
  .check(z.regex(/^\d{4}-\d{2}-\d{2}T\d{2}:\d{2}(:\d{2}(\.\d+)?)?(Z|[+-]\d{2}:\d{2})$/));

/** Of two states of one record the higher counter wins, ties by writer; the other is kept as history. */
export const revision = z.object({ counter: whole, writer: id });
export type Revision = z.infer<typeof revision>;
