import { english } from './en/english.ts';
import { type Format, formatFor } from './format.ts';
import { type Area, type Spoken, spoken } from './message.ts';

/** Another language must have the same areas with the same keys and gaps: the compiler asks for it. */
export type Catalogue = typeof english;

/** Everything that people read, in one language: `words.room.undo`, `words.room.kept({ kept: 41, of: 43 })`. */
export type Words = { readonly [Name in keyof Catalogue]: Spoken<Catalogue[Name]> } & { readonly f: Format };

function bind(catalogue: Catalogue, locale: string): Words {
  const f = formatFor(locale);
  const areas = Object.entries(catalogue).map(([name, area]) => [name, spoken(area as Area, f)]);
  return { ...(Object.fromEntries(areas) as Omit<Words, 'f'>), f } as Words;
}

/** The words of the program. English is the only language so far; others join by their catalogue. */
export function wordsFor(locale = 'en-GB'): Words {
  return bind(english, locale);
}
