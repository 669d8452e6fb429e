import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { indexPages } from '../../src/search/build/index-pages.ts';
import type { Excerpt } from '../../src/search/reader/excerpt.ts';
import { excerptOf } from '../../src/search/reader/excerpt.ts';
import type { Filters } from '../../src/search/reader/narrow.ts';
import type { Search } from '../../src/search/reader/search.ts';
import { compareAnswers, hasDroppedSymbol } from './compare-answers.ts';
import { memorySearch } from './memory-search.ts';
import { openStockClient, type StockClient } from './stock-client.ts';
import { syntheticPages, syntheticQueries } from './synthetic-pages.ts';

// the long run: SEARCH_PAGES=2000 SEARCH_QUERIES=1000
const PAGES = Number(process.env.SEARCH_PAGES ?? 200);
const QUERIES = Number(process.env.SEARCH_QUERIES ?? 1200);
const FILTERS: readonly Filters[] = [
  {},
  { kind: 'bar' },
  { page: 'formulas', process: 'cold' },
  { page: 'methods', kind: 'paste' },
  { kind: 'cake' },
];
let memory: Awaited<ReturnType<typeof memorySearch>>;
let ours: Search;
let stock: StockClient;

beforeAll(async () => {
  const files = await indexPages(syntheticPages(PAGES, 2026));
  memory = await memorySearch(files, { shortestBeginning: 1 });
  ours = memory.search;
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
      if (hasDroppedSymbol(query)) continue;
      const verdict = await compareAnswers(query, memory, stock);
      if (verdict === 'undecided') undecided++;
      else if (verdict !== 'same') differences.push(`${JSON.stringify(query)}: ${verdict}`);
      if ((await ours.find(query))?.length) answered++;
    }
    expect(differences).toEqual([]);
    expect(answered).toBeGreaterThan(QUERIES / 2);
    expect(undecided).toBeLessThanOrEqual(QUERIES / 200);
  }, 3_600_000);

  test(`filters: ${QUERIES / 4} queries`, async () => {
    const differences: string[] = [];
    let answered = 0;
    for (const [i, query] of syntheticQueries(QUERIES / 4, 13).entries()) {
      if (hasDroppedSymbol(query)) continue;
      const filters = FILTERS[i % FILTERS.length] ?? {};
      const verdict = await compareAnswers(query, memory, stock, filters);
      if (verdict !== 'same' && verdict !== 'undecided') {
        differences.push(`${JSON.stringify(query)} ${JSON.stringify(filters)}: ${verdict}`);
      }
      const hits = await ours.narrow((await ours.find(query)) ?? [], filters);
      if (hits.length > 1) answered++;
    }
    expect(differences).toEqual([]);
    expect(answered).toBeGreaterThan(QUERIES / 16);
  }, 3_600_000);

  test('the excerpts are the same, marks included', async () => {
    for (const query of syntheticQueries(64, 11)) {
      const theirs = await stock.search(query);
      for (const hit of ((await ours.find(query)) ?? []).slice(0, 3)) {
        const hash = ours.contents.pages[hit.page]?.hash;
        const same = await theirs.find(({ id }) => id === hash)?.data();
        const { content } = await ours.pageText(hit.page);
        expect(asMarked(excerptOf(content, hit.places())), query).toBe(same?.excerpt);
      }
    }
  });
});

const asMarked = ({ parts }: Excerpt) =>
  parts
    .map(({ text, found }) => (found ? `<mark>${escaped(text)}</mark>` : escaped(text)))
    .join(' ')
    .trim();

const escaped = (text: string) =>
  text.replaceAll('&', '&amp;').replaceAll('<', '&lt;').replaceAll('>', '&gt;');
