import { wellFormed } from '../well-formed.ts';
import type { Stem } from './stemmer.ts';

/** What was typed, taken apart as the index took the pages apart. */
export interface Query {
  /** The whole query stands in quotes: its words must follow one another. */
  readonly phrase: boolean;
  readonly terms: readonly QueryTerm[];
}

export interface QueryTerm {
  /** Lower case, with the marks that were typed. */
  readonly typed: string;
  /** Without marks. */
  readonly bare: string;
  readonly stem: string;
  /** Without symbols such as `+`, which the index drops and the query keeps; `null` where it is the same or empty. */
  readonly withoutSymbols: string | null;
}

/** Letters of a query beyond this are left out: enough for any sentence, too few to stall a page. */
export const LONGEST_QUERY = 1000;

const PUNCTUATION = /^\p{Pd}|[\p{Pe}\p{Pf}\p{Pi}\p{Po}]|\p{Ps}$/u;
/** Kept in a query by the stock client, though the index drops them: it finds no `P305+P351`. */
const DROPPED = /[\p{Sm}\p{Sc}\p{Sk}]/gu;
// voiced kana lose their meaning without these two
const MARKS = /(?![\u3099\u309A])\p{M}/gu;

/** Reads a query. Never throws: lone surrogates, markup and control characters are letters like others. */
export function readQuery(typed: string, include: ReadonlySet<string>, stem: Stem): Query {
  const text = typed.slice(0, LONGEST_QUERY);
  let kept = '';
  for (const letter of lettersOf(text)) {
    if (include.has(letter)) kept += letter;
    else if (!PUNCTUATION.test(letter)) kept += letter.toLowerCase();
  }
  const terms = kept
    .replace(/\s{2,}/g, ' ')
    .trim()
    .split(' ')
    .map((term) => ({ typed: wellFormed(term), bare: wellFormed(withoutMarks(term)) }))
    .filter(({ bare }) => bare !== '')
    .map(({ typed, bare }) => {
      const letters = bare.replace(DROPPED, '');
      const withoutSymbols = letters === bare || letters === '' ? null : stem(letters);
      return { typed, bare, stem: stem(bare), withoutSymbols };
    });
  return { phrase: /^\s*".+"\s*$/.test(typed), terms };
}

/** What a reader takes for one letter. Printable ASCII has no others than its characters, and needs no segmenter made. */
function* lettersOf(text: string): Iterable<string> {
  if (/^[ -~]*$/.test(text)) yield* text;
  else if (typeof Intl.Segmenter === 'function') {
    const letters = new Intl.Segmenter(undefined, { granularity: 'grapheme' }).segment(text);
    for (const { segment } of letters) yield segment;
  }
  // Firefox before 125 has none: a letter and its marks, which is the same in the languages of the handbook
  else for (const [letter] of text.matchAll(/\P{M}\p{M}*|\p{M}+/gu)) yield letter;
}

/** The text without its combining marks. */
export const withoutMarks = (text: string): string =>
  text.normalize('NFD').replace(MARKS, '').normalize('NFC');
