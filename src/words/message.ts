import type { Format } from './format.ts';

/** A sentence with gaps: its values and the number forms of its language. */
export type Message<Values> = (values: Values, f: Format) => string;

/** One area of the catalogue: plain texts and sentences with gaps. */
export type Area = Readonly<Record<string, string | Message<never>>>;

/** The same area with its formatter filled in: texts stay texts, sentences take their values only. */
export type Spoken<A> = {
  readonly [Key in keyof A]: A[Key] extends (values: infer Values, f: Format) => string
    ? (values: Values) => string
    : string;
};

/** Binds an area to the number forms of its language. */
export function spoken<A extends Area>(area: A, f: Format): Spoken<A> {
  const entries = Object.entries(area).map(([key, message]) => [
    key,
    typeof message === 'function' ? (values: never) => (message as Message<never>)(values, f) : message,
  ]);
  return Object.fromEntries(entries) as Spoken<A>;
}
