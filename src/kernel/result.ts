/**
 * An expected failure is a value, not an exception. `code` names a sentence of the message catalogue,
 * `values` fills its gaps; the pure floors never write sentences themselves.
 */
export interface Problem<Code extends string = string> {
  readonly code: Code;
  readonly values: Readonly<Record<string, string | number>>;
}

export type Result<T, P = Problem> =
  | { readonly ok: true; readonly value: T }
  | { readonly ok: false; readonly problem: P };

/** Wraps a value as a success. */
export function ok<T>(value: T): { readonly ok: true; readonly value: T } {
  return { ok: true, value };
}

/** Makes a failure out of a catalogue code and the values of its sentence. */
export function problem<Code extends string>(
  code: Code,
  values: Readonly<Record<string, string | number>> = {},
): { readonly ok: false; readonly problem: Problem<Code> } {
  return { ok: false, problem: { code, values } };
}
