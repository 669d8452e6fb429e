import { beforeAll, describe, expect, test } from 'vitest';
import type { IndexFile } from '../../src/search/build/data-kinds.ts';
import { dataFiles } from '../../src/search/build/data-kinds.ts';
import { indexPages } from '../../src/search/build/index-pages.ts';
import { inflatePayload } from '../../src/search/reader/payload.ts';
import { openSearch, type SearchEntry } from '../../src/search/reader/search.ts';
import { memorySearch } from './memory-search.ts';
import { syntheticPages } from './synthetic-pages.ts';

let files: readonly IndexFile[];
let entry: SearchEntry;

beforeAll(async () => {
  files = await indexPages(syntheticPages(30, 3));
  ({ entry } = await memorySearch(files));
});

describe('any query has an answer', () => {
  test.each([
    ['nothing', '', null],
    ['blanks', ' \t\n ', null],
    ['quotes around nothing', '""', null],
    ['punctuation', '?!…()', null],
    ['nonsense', 'qzxqzx', []],
  ])('%s', async (_, query, answer) => {
    const { search } = await memorySearch(files);
    expect(await search.find(query)).toEqual(answer);
  });

  test.each([
    ['10,000 letters', 's'.repeat(10_000)],
    ['10,000 words', 'soap '.repeat(10_000)],
    ['10,000 marks', `a${'\u0301'.repeat(10_000)}`],
    ['control characters', 'soap\u0000\u0007\u001b'],
    ['a lone surrogate', 'soap \ud800'],
    ['markup', '<img src=x onerror=alert(1)>'],
    ['names that objects have', 'constructor __proto__ toString'],
  ])('%s, within few seconds', async (_, query) => {
    const { search } = await memorySearch(files);
    const before = performance.now();
    expect(Array.isArray(await search.find(query))).toBe(true);
    expect(performance.now() - before).toBeLessThan(5000);
  });
});

describe('a broken index is an error, never an answer', () => {
  const openWith = (change: (file: IndexFile) => Uint8Array | undefined) =>
    openSearch(entry, async (name) => {
      const file = files.find(({ path }) => path === name);
      const content = file && change(file);
      if (!content) throw new Error(`${name} cannot be loaded`);
      return inflatePayload(Uint8Array.from(content));
    });
  const only =
    (part: RegExp, change: (content: Uint8Array) => Uint8Array | undefined) =>
    ({ path, content }: IndexFile) =>
      part.test(path) ? change(content) : content;

  test.each([
    ['missing', () => undefined],
    ['empty', () => new Uint8Array()],
    ['cut short', (content: Uint8Array) => content.subarray(0, content.length / 2)],
    ['a web page', () => new TextEncoder().encode('<!doctype html>')],
    [
      'one bit wrong',
      (content: Uint8Array) => content.map((byte, i) => (i === 300 ? byte ^ 4 : byte)),
    ],
  ])('a word chunk that is %s', async (_, change) => {
    const search = await openWith(only(/pf_index$/, change));
    await expect(search.find('soap')).rejects.toThrow();
  });

  test('a table of contents cut short', () =>
    expect(openWith(only(/pf_meta$/, (content) => content.subarray(0, 40)))).rejects.toThrow());

  test('a filter that the index lacks', async () => {
    const { search } = await memorySearch(files);
    await expect(search.narrow([], { colour: 'red' })).rejects.toThrow('no filter "colour"');
  });

  test('a load that failed is tried again', async () => {
    let broken = true;
    const search = await openWith(only(/pf_index$/, (content) => (broken ? undefined : content)));
    await expect(search.find('soap')).rejects.toThrow('cannot be loaded');
    broken = false;
    expect((await search.find('soap'))?.length).toBeGreaterThan(0);
  });
});

test('an unknown kind of file stops the build; programs and stock pages are left out', () => {
  const kinds = new Set(dataFiles(files).map(({ path }) => path.split('.').at(-1)));
  expect([...kinds].sort()).toEqual(['json', 'pf_filter', 'pf_fragment', 'pf_index', 'pf_meta']);
  expect(files.some(({ path }) => path.startsWith('wasm.'))).toBe(true);
  expect(() => dataFiles([{ path: 'index/en_1.pf_new', content: new Uint8Array() }])).toThrow(
    'index/en_1.pf_new',
  );
});
