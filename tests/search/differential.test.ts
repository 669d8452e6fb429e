import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { indexPages } from '../../src/search/build/index-pages.ts';
import type { Excerpt } from '../../src/search/reader/excerpt.ts';
import { excerptOf } from '../../src/search/reader/excerpt.ts';
import type { Hit } from '../../src/search/reader/hit.ts';
import type { Search } from '../../src/search/reader/search.ts';
import { memorySearch } from './memory-search.ts';
import { openStockClient, type StockClient, type StockResult } from './stock-client.ts';
import { syntheticPages, syntheticQueries } from './synthetic-pages.ts';

// SEARCH_PAGES and SEARCH_QUERIES make the long run; see DEVELOPERS.md
const PAGES = Number(process.env.SEARCH_PAGES ?? 200);
const QUERIES = Number(process.env.SEARCH_QUERIES ?? 1200);
// the stock client adds up in 32 bits
const tolerance = (score: number) => 1e-5 * Math.max(1, score);

let ours: Search;
let stock: StockClient;

beforeAll(async () => {
  const files = await indexPages(syntheticPages(PAGES, 2026));
  ours = (await memorySearch(files, { shortestBeginning: 1 })).search;
  stock = await openStockClient(
    files,
    ours.contents.chunks.flatMap(({ from, to }) => [from, to]),
  );
});
afterAll(() => stock.close());

describe('the reader finds what the stock client finds', () => {
  test(`${QUERIES} queries over ${PAGES} pages: same pages, same scores, same order`, async () => {
    const differences: string[] = [];
    let answered = 0;
    let undecided = 0;
    for (const query of syntheticQueries(QUERIES, 7)) {
      const theirs = await stock.search(query);
      const found = (await ours.find(query)) ?? [];
      if (theirs.length > 0) answered++;
      const verdict = compare(found, theirs);
      if (verdict === 'undecided') undecided++;
      else if (verdict !== 'same') differences.push(`${JSON.stringify(query)}: ${verdict}`);
    }
    expect(differences).toEqual([]);
    expect(answered).toBeGreaterThan(QUERIES / 2);
    expect(undecided).toBeLessThanOrEqual(QUERIES / 200);
  }, 3_600_000);

  test('the excerpts are the same, marks included', async () => {
    for (const query of syntheticQueries(64, 11)) {
      const theirs = await stock.search(query);
      for (const hit of ((await ours.find(query)) ?? []).slice(0, 3)) {
        const hash = ours.contents.pages[hit.page]?.hash;
        const same = await theirs.find(({ id }) => id === hash)?.data();
        const { content } = await ours.pageText(hit.page);
        expect(asMarked(excerptOf(content, hit.places)), query).toBe(same?.excerpt);
      }
    }
  });
});

/**
 * `undecided`: two words that answer one term stand in one place (a compound and its part), on a page with so many
 * places that the stock client's sort, which is not stable, takes either of them.
 */
function compare(found: readonly Hit[], theirs: readonly StockResult[]): string {
  const scores = new Map(theirs.map(({ id, score }) => [id, score]));
  const pairs = found.map((hit) => ({
    ours: hit.score,
    stock: scores.get(ours.contents.pages[hit.page]?.hash ?? '') ?? Number.NaN,
    crowded: hit.places.length > 10,
  }));
  if (found.length !== theirs.length || pairs.some((pair) => Number.isNaN(pair.stock))) {
    return `${theirs.length} pages, found ${found.length}`;
  }
  const off = pairs.filter((pair) => Math.abs(pair.ours - pair.stock) > tolerance(pair.stock));
  if (off.some((pair) => !pair.crowded || Math.abs(pair.ours / pair.stock - 1) > 0.1)) {
    return `${off.length} of ${found.length} scores are different`;
  }
  const same = pairs.filter((pair) => !off.includes(pair));
  const inOrder = same.every(
    ({ stock }, i) => i === 0 || stock <= (same[i - 1]?.stock ?? 0) + tolerance(stock),
  );
  return inOrder ? (off.length > 0 ? 'undecided' : 'same') : 'another order';
}

const asMarked = ({ parts }: Excerpt) =>
  parts
    .map(({ text, found }) => (found ? `<mark>${escaped(text)}</mark>` : escaped(text)))
    .join(' ')
    .trim();

const escaped = (text: string) =>
  text.replaceAll('&', '&amp;').replaceAll('<', '&lt;').replaceAll('>', '&gt;');
