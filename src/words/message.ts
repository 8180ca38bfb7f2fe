import { type Format, formatFor } from './format.ts';

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

/** A catalogue, or a part of one, with its number forms filled in, which are there as `f` too. */
export type Bound<C> = { readonly [Name in keyof C]: Spoken<C[Name]> } & { readonly f: Format };

/** Binds all areas of a catalogue to the number forms of a language. */
export function bind<C extends object>(catalogue: C, locale: string): Bound<C> {
  const f = formatFor(locale);
  const areas = Object.entries(catalogue).map(([name, area]) => [name, spoken(area as Area, f)]);
  return { ...Object.fromEntries(areas), f } as Bound<C>;
}
