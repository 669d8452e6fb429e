import { wordsOfText } from '../reader/excerpt.ts';
import type { IndexedWord } from '../reader/index-format.ts';
import { positionsOf } from '../reader/index-format.ts';
import { withoutMarks } from '../reader/query.ts';
import type { Stem } from '../reader/stemmer.ts';

/** Where a word was seen first: number of the page, number of the word in it. */
interface Seen {
  readonly page: number;
  readonly position: number;
}

/** Words of Latin letters; a stem is not longer than its word by more than one. Codes and numbers have no stem. */
const STEMMED = /^\p{Script=Latin}+$/u;

/**
 * The words of the indexed texts whose stem in the index is not what `stem` gives, with the stem that the index has.
 * `texts` are the texts of the pages by page number.
 */
export function stemExceptions(
  texts: readonly string[],
  index: readonly IndexedWord[],
  stem: Stem,
): Readonly<Record<string, string>> {
  const seen = wordsSeen(texts);
  const stored = storedAt(index, new Set([...seen.values()].map(keyOf)));
  const exceptions: [string, string][] = [];
  for (const [word, place] of seen) {
    const there = stored.get(keyOf(place)) ?? [];
    if (there.includes(stem(word))) continue;
    const nearest = there
      .filter((each) => commonLength(each, word) >= 2 && each.length <= word.length + 1)
      .toSorted((a, b) => commonLength(b, word) - commonLength(a, word) || a.length - b.length)[0];
    if (nearest !== undefined) exceptions.push([word, nearest]);
  }
  return Object.fromEntries(exceptions.sort(([a], [b]) => (a < b ? -1 : 1)));
}

/** Each word of the texts, and each part of a compound, as a query would spell it. */
function wordsSeen(texts: readonly string[]): ReadonlyMap<string, Seen> {
  const seen = new Map<string, Seen>();
  for (const [page, text] of texts.entries()) {
    for (const [position, token] of wordsOfText(text).entries()) {
      for (const part of withoutMarks(token.toLowerCase()).split(/[^\p{L}\p{N}]+/u)) {
        if (STEMMED.test(part) && !seen.has(part)) seen.set(part, { page, position });
      }
    }
  }
  return seen;
}

/** The words that the index has at the places asked for. */
function storedAt(index: readonly IndexedWord[], keys: ReadonlySet<string>) {
  const stored = new Map<string, string[]>([...keys].map((key) => [key, []]));
  for (const { word, forms } of index) {
    for (const onPage of forms.flatMap(({ pages }) => pages)) {
      for (const position of positionsOf(onPage)) {
        stored.get(keyOf({ page: onPage.page, position }))?.push(word);
      }
    }
  }
  return stored;
}

const keyOf = ({ page, position }: Seen) => `${page} ${position}`;

function commonLength(a: string, b: string): number {
  let length = 0;
  while (length < a.length && a[length] === b[length]) length++;
  return length;
}
