import { type IndexedWord, positionsOf } from '../../src/search/reader/index-format.ts';
import type { Filters } from '../../src/search/reader/narrow.ts';
import { readQuery } from '../../src/search/reader/query.ts';
import { stemmerFor } from '../../src/search/reader/stemmer.ts';
import type { memorySearch } from './memory-search.ts';
import type { StockClient } from './stock-client.ts';

// the stock client adds up in 32 bits
const tolerance = (score: number) => 1e-5 * Math.max(1, score);
/** Up to so many occurrences Rust's unstable sort keeps equal ones in order. */
const STABLE = 20;

/** The stock client looks for `+`, `<` and the like, which the index drops; we do not. */
export const hasDroppedSymbol = (query: string) => /[\p{Sm}\p{Sc}\p{Sk}]/u.test(query);

/**
 * Whether the stock client answers as we do: `same`, `undecided`, or what differs. `undecided`: pages, and the order of
 * all others, are the same, but on some page two words that answer one term stand in one place (a compound and its
 * part), and the stock client's sort, which is not stable, takes either of them.
 */
export async function compareAnswers(
  query: string,
  { search, words, entry }: Awaited<ReturnType<typeof memorySearch>>,
  stock: StockClient,
  filters: Filters = {},
): Promise<string> {
  const theirs = await stock.search(query, { filters });
  const found = await search.narrow((await search.find(query)) ?? [], filters);
  const scores = new Map(theirs.map(({ id, score }) => [id, score]));
  const pairs = found.map(({ page, score, places }) => ({
    page,
    score,
    places,
    stock: scores.get(search.contents.pages[page]?.hash ?? '') ?? Number.NaN,
  }));
  if (found.length !== theirs.length || pairs.some((pair) => Number.isNaN(pair.stock))) {
    return `${theirs.length} pages, found ${found.length}`;
  }
  const off = pairs.filter((pair) => Math.abs(pair.score - pair.stock) > tolerance(pair.stock));
  const stem = stemmerFor(entry.language, entry.stemExceptions);
  const stems = readQuery(query, new Set(entry.includeCharacters), stem).terms.map(
    (term) => term.stem,
  );
  const wrong = off.filter(({ page }) => !isTied(words, stems, page));
  if (wrong.length > 0) return `${wrong.length} of ${found.length} scores are different`;
  const same = pairs.filter((pair) => !off.includes(pair));
  const inOrder = same.every(
    (pair, i) => i === 0 || pair.stock <= (same[i - 1]?.stock ?? 0) + tolerance(pair.stock),
  );
  return inOrder ? (off.length > 0 ? 'undecided' : 'same') : 'another order';
}

/** Whether two words that answer one term share a place on a page that has too many places to be sorted stably. */
function isTied(words: readonly IndexedWord[], stems: readonly string[], page: number): boolean {
  const positions = stems.map((stem) =>
    words
      .filter(({ word }) => word.startsWith(stem))
      .flatMap(({ forms }) => forms.flatMap(({ pages }) => pages))
      .filter((onPage) => onPage.page === page)
      .flatMap(positionsOf),
  );
  const shared = positions.some((list) => new Set(list).size < list.length);
  return shared && positions.flat().length > STABLE;
}
