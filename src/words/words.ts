import { english } from './en/english.ts';
import { type Bound, bind } from './message.ts';

/** Another language must have the same areas with the same keys and gaps: the compiler asks for it. */
export type Catalogue = typeof english;

/** Everything that people read, in one language: `words.room.undo`, `words.room.kept({ kept: 41, of: 43 })`. */
export type Words = Bound<Catalogue>;

/** The words of the program. English is the only language so far; others join by their catalogue. */
export function wordsFor(locale = 'en-GB'): Words {
  return bind(english, locale);
}
