import { stemmer } from '@orama/stemmers/spanish';
import { withoutMarks } from '../query.ts';
import type { Stem } from '../stemmer.ts';

/** The algorithm knows the ending of “fracción” by its accent, which a word without marks has lost. */
const spanish: Stem = (word) => withoutMarks(stemmer(word.replace(/([cs])ion$/, '$1ión')));

export const stemmers = { es: spanish };
