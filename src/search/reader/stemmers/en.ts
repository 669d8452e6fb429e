import porter2 from 'wink-porter2-stemmer';
import type { Stem } from '../stemmer.ts';

// the package writes a consonant y as 3, and would give the code QY-013 an end of `01y`
const english: Stem = (word) =>
  word.includes('3')
    ? porter2(word.replaceAll('3', '\u{1}')).replaceAll('\u{1}', '3')
    : porter2(word);

export const stemmers = { en: english };
