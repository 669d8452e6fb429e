import { describe, expect, test } from 'vitest';
import { indexPages } from '../../src/search/build/index-pages.ts';
import { wordsOfText } from '../../src/search/reader/excerpt.ts';
import type { Hit } from '../../src/search/reader/hit.ts';
import { memorySearch } from './memory-search.ts';
import { syntheticPages } from './synthetic-pages.ts';

describe('every word on every page finds its page', () => {
  test.each([
    { pages: 60, chunk: '20000' },
    { pages: 60, chunk: '150' },
  ])('$pages pages, chunks of $chunk', async ({ pages, chunk }) => {
    process.env.PAGEFIND_UNSTABLE_INDEX_CHUNK_SIZE = chunk;
    const files = await indexPages(syntheticPages(pages, 5));
    delete process.env.PAGEFIND_UNSTABLE_INDEX_CHUNK_SIZE;
    const { search, texts } = await memorySearch(files);
    expect(search.contents.chunks.length > 10).toBe(chunk === '150');
    const found = new Map<string, ReadonlySet<number> | null>();
    const missed: string[] = [];
    for (const [page, text] of texts.entries()) {
      for (const word of wordsOfText(text)) {
        if (!found.has(word)) {
          const hits = await search.find(word);
          found.set(word, hits && new Set(hits.map((hit) => hit.page)));
        }
        // punctuation alone is no word: null
        const pagesFound = found.get(word);
        if (pagesFound && !pagesFound.has(page)) missed.push(`${word} on page ${page}`);
      }
    }
    expect(missed).toEqual([]);
    expect(found.size).toBeGreaterThan(300);
  });

  test('what was looked for before changes nothing', async () => {
    process.env.PAGEFIND_UNSTABLE_INDEX_CHUNK_SIZE = '150';
    const files = await indexPages(syntheticPages(40, 6));
    delete process.env.PAGEFIND_UNSTABLE_INDEX_CHUNK_SIZE;
    const { search: used } = await memorySearch(files);
    for (const letter of 'abcdefghijklmnopqrstuvwxyz') await used.find(`${letter}a ${letter}e`);
    for (const query of ['s', 'so', 'wat', 'oliv', 'saltzz', 'zzz', 'lying', '"soap olive"']) {
      const { search: fresh } = await memorySearch(files);
      expect(withPlaces(await used.find(query)), query).toEqual(
        withPlaces(await fresh.find(query)),
      );
    }
  });
});

const withPlaces = (hits: readonly Hit[] | null) =>
  hits?.map(({ page, score, places }) => ({ page, score, places: places() }));
