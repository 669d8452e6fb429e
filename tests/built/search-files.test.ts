import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { gunzipSync } from 'node:zlib';
import { describe, expect, inject, test } from 'vitest';
import { chunksIn } from '../../src/search/build/chunk-scripts.ts';
import { PAGE_TYPES } from '../../src/search/finder/page-types.ts';
import { wordsOfText } from '../../src/search/reader/excerpt.ts';
import type { Filters } from '../../src/search/reader/narrow.ts';
import { inflatePayload } from '../../src/search/reader/payload.ts';
import { openSearch, type SearchEntry } from '../../src/search/reader/search.ts';
import { siteFiles } from '../support/site-files.ts';

const site = inject('site');
const read = (path: string) => readFileSync(join(site, path), 'utf8');
const scripts = siteFiles(site).filter((path) => /^search\/.*\.pf_|^search\/entry/.test(path));
const chunks = Object.assign({}, ...scripts.map((path) => chunksIn(read(path)))) as Record<
  string,
  string
>;
const entry: SearchEntry = JSON.parse(chunks['entry.en'] ?? '');
const bytesOf = (name: string) => {
  const chunk = chunks[name];
  if (chunk === undefined) throw new Error(`no ${name}`);
  return Uint8Array.from(Buffer.from(chunk, 'base64'));
};
const open = () => openSearch(entry, async (name) => inflatePayload(bytesOf(name)));

describe('what the search brings to the site', () => {
  test('is scripts of the known kinds and the data of the finder, nothing else', () => {
    const found = siteFiles(site).filter((path) => path.startsWith('search/'));
    const known =
      /^search\/(entry\.[a-z-]+|finder|(index|fragment|filter)\/[a-z0-9_-]+\.pf_(index|fragment|filter))\.js$/;
    expect(found.filter((path) => !known.test(path))).toEqual([]);
    expect(scripts.length).toBeGreaterThan(30);
  });

  test('holds no WebAssembly, packed or not, and no script asks for any', () => {
    const magic = Buffer.from([0x00, 0x61, 0x73, 0x6d]);
    const packed = Object.keys(chunks).filter((name) => !name.startsWith('entry.'));
    const holding = packed.filter((name) => {
      const bytes = bytesOf(name);
      return Buffer.from(bytes).includes(magic) || gunzipSync(bytes).includes(magic);
    });
    expect(holding).toEqual([]);
    const asking = siteFiles(site).filter(
      (path) => path.endsWith('.js') && /WebAssembly|\beval\(|new Function\(/.test(read(path)),
    );
    expect(asking).toEqual([]);
  });
});

describe('the search of the demo', () => {
  test('every word of every indexed page finds its page', async () => {
    const search = await open();
    const found = new Map<string, ReadonlySet<number> | null>();
    const missed: string[] = [];
    for (const page of search.contents.pages.keys()) {
      const { url, content } = await search.pageText(page);
      for (const word of new Set(
        wordsOfText(content).filter((token) => /[\p{L}\p{N}]/u.test(token)),
      )) {
        if (!found.has(word)) {
          const hits = await search.find(word);
          found.set(word, hits && new Set(hits.map((hit) => hit.page)));
        }
        const pages = found.get(word);
        if (pages && !pages.has(page)) missed.push(`${word}: ${url}`);
      }
    }
    expect(missed).toEqual([]);
    expect(found.size).toBeGreaterThan(1000);
  });

  test('each formula page is found first by its code', async () => {
    const search = await open();
    expect(entry.rows.length).toBeGreaterThan(20);
    for (const page of entry.rows) {
      const { url, meta } = await search.pageText(page);
      expect(url).toBe(`formulas/${meta.code}.html`);
      expect((await search.find(meta.code ?? ''))?.[0]?.page, meta.code).toBe(page);
    }
  });

  test('each formula page is found first by its name in quotes', async () => {
    const search = await open();
    for (const page of entry.rows) {
      const { meta } = await search.pageText(page);
      const hits = await search.find(`"${meta.title}"`);
      expect(
        hits?.map((hit) => hit.page),
        meta.title,
      ).toContain(page);
    }
  });

  test('pages are narrowed by type, kind and process, as the data of the formulas says', async () => {
    const search = await open();
    const all = [...search.contents.pages.keys()].map((page) => ({
      page,
      score: 0,
      places: () => [],
    }));
    const urls = async (filters: Filters) =>
      Promise.all(
        (await search.narrow(all, filters)).map(
          async ({ page }) => (await search.pageText(page)).url,
        ),
      );
    const formulas = formulaData().map((each) => ({ ...each, url: `formulas/${each.code}.html` }));
    expect(await urls({ page: 'formulas' })).toEqual(formulas.map(({ url }) => url));
    expect(await urls({ page: 'safety' })).toEqual(['safety.html']);
    expect(await urls({ page: 'methods' })).toContain('methods.html');
    expect(await urls({ page: 'materials' })).toContain('fats/olive.html');
    const types = await Promise.all(PAGE_TYPES.map((page) => urls({ page })));
    expect(types.flat()).toHaveLength(all.length);
    for (const kind of ['bar', 'liquid', 'paste']) {
      for (const process of ['cold', 'hot']) {
        const wanted = formulas.filter((each) => each.kind === kind && each.process === process);
        expect(await urls({ kind, process })).toEqual(wanted.map(({ url }) => url));
      }
    }
  });
});

interface FormulaData {
  readonly code: string;
  readonly kind: string;
  readonly process: string;
}

/** What the handbook gives out as files, by code. */
const formulaData = (): readonly FormulaData[] =>
  siteFiles(site)
    .filter((path) => /^data\/formulas\/.*\.json$/.test(path))
    .sort()
    .map((path) => JSON.parse(read(path)));
