import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { expect, inject, test } from 'vitest';
import { indexPages } from '../../src/search/build/index-pages.ts';
import { wordsOfText } from '../../src/search/reader/excerpt.ts';
import { compareAnswers, hasDroppedSymbol } from '../search/compare-answers.ts';
import { memorySearch } from '../search/memory-search.ts';
import { openStockClient } from '../search/stock-client.ts';
import { chance } from '../support/chance.ts';
import { sitePages } from '../support/site-files.ts';

const QUERIES = 1000;
const site = inject('site');

test(`${QUERIES} queries made from the words of the demo: as the stock client answers`, async () => {
  const pages = sitePages(site)
    .map((path) => ({ path, html: readFileSync(join(site, path), 'utf8') }))
    .filter(({ html }) => html.includes('data-pagefind-body'));
  const files = await indexPages(pages);
  const memory = await memorySearch(files, { shortestBeginning: 1 });
  const stock = await openStockClient(
    files,
    memory.search.contents.chunks.flatMap(({ from, to }) => [from, to]),
  );
  const random = chance(26);
  const words = wordsOfText(memory.texts.join(' '));
  const start = () => random.below(words.length - 3);
  const kinds = [
    () => random.pick(words),
    () => random.pick(words).slice(0, 2 + random.below(5)),
    () => `${random.pick(words)} ${random.pick(words)}`,
    () => `"${words.slice(start()).slice(0, 2).join(' ').replaceAll('"', '')}"`,
    () => `${random.pick(words)} ${random.pick(words)} ${random.pick(words).slice(0, 3)}`,
  ];
  const differences: string[] = [];
  let undecided = 0;
  for (let i = 0; i < QUERIES; i++) {
    const query = kinds[i % kinds.length]?.() ?? '';
    // without a word in it we find nothing, where the stock client lists every page
    if (!(await memory.search.find(query))) continue;
    if (hasDroppedSymbol(query)) continue;
    const verdict = await compareAnswers(query, memory, stock);
    if (verdict === 'undecided') undecided++;
    else if (verdict !== 'same') differences.push(`${JSON.stringify(query)}: ${verdict}`);
  }
  stock.close();
  expect(differences).toEqual([]);
  // the addresses of sources are compounds of many words, which two letters often tie
  expect(undecided).toBeLessThanOrEqual(QUERIES / 8);
}, 600_000);
