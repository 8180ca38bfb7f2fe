import { core } from './en/core.ts';
import { type Bound, bind } from './message.ts';

/** The words that the recording screen needs, and those that are said everywhere: the first ones to be loaded. */
export type CoreWords = Bound<typeof core>;

/** `wordsFor` has them too, with all others. */
export function coreWordsFor(locale = 'en-GB'): CoreWords {
  return bind(core, locale);
}
