import { stemmers } from './stemmers/all.ts';

/** The stem of one lower-case word without marks. */
export type Stem = (word: string) => string;

/**
 * Longer words keep their endings: the package's patterns slow down with the square of the length. Addresses of
 * sources, which the index takes as one word each, are shorter.
 */
const LONGEST_WORD = 300;

/**
 * The stemmer of a language (`en`, `en-gb`), or one that leaves words alone where there is none. `exceptions` are
 * the words of this handbook whose stem in the index is another than the package's; the build finds them.
 */
export function stemmerFor(language: string, exceptions: Readonly<Record<string, string>>): Stem {
  const stem = stemmers[language.split('-')[0] ?? ''] ?? ((word: string) => word);
  const excepted = new Map(Object.entries(exceptions));
  return (word) => excepted.get(word) ?? (word.length > LONGEST_WORD ? word : stem(word));
}
