import type { Stem } from '../stemmer.ts';
import { stemmers as english } from './en.ts';
import { stemmers as spanish } from './es.ts';

/** By the BCP 47 subtag of the language. The scripts of a page get the file of their own language instead of this. */
export const stemmers: Readonly<Record<string, Stem>> = { ...english, ...spanish };
