import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { pathToFileURL } from 'node:url';
import type { Browser } from 'playwright-core';
import { getDocumentProxy } from 'unpdf';
import { afterAll, beforeAll, describe, expect, inject, test } from 'vitest';
import { printBook } from '../../src/commands/print-book.ts';
import { launch } from './launch.ts';

const site = inject('site');
/** Printed whole it takes half a minute; these chapters have all that a page can hold. */
const CHAPTERS = [
  'safety',
  'formulas-QY-014',
  'formulas-QY-021',
  'formulas-QY-033',
  'lye-pilot',
  'fats-olive',
  'methods',
  'changes',
];

interface Printed {
  /** What stands on each printed page, in the order of painting, without spaces. */
  readonly pages: readonly string[];
  readonly outline: readonly string[];
  readonly contents: readonly { readonly title: string; readonly number: number }[];
  readonly rows: readonly string[];
  readonly blocks: readonly string[];
  readonly sources: { readonly head: string; readonly rows: readonly string[] };
}

let browser: Browser;
let printed: Printed;
beforeAll(async () => {
  browser = await launch();
  const page = await browser.newPage();
  await page.goto(`${pathToFileURL(site).href}/print.html`);
  await page.evaluate((kept) => {
    for (const chapter of document.querySelectorAll('.chapter')) {
      if (kept.includes(chapter.id)) continue;
      document.querySelector(`.leaf[data-chapter="${chapter.id}"]`)?.closest('li')?.remove();
      chapter.remove();
    }
  }, CHAPTERS);
  const file = await printBook(page, 'A4');
  const seen = await page.evaluate(() => {
    const textOf = (node: Element | null) => {
      const copy = node?.cloneNode(true) as Element | undefined;
      for (const unseen of copy?.querySelectorAll('.unseen, svg, math') ?? []) unseen.remove();
      return (copy?.textContent ?? '').replace(/\s+/g, '');
    };
    const all = (selector: string) => [...document.querySelectorAll(selector)];
    return {
      contents: all('.book-contents li:has(.leaf)').map((line) => ({
        title: textOf(line.querySelector('a')),
        number: Number(line.querySelector('.leaf')?.textContent),
      })),
      rows: all('.chapter tbody tr:not(:has(svg, math, ul))').map(textOf),
      blocks: all('.chapter .caution, .chapter .batch-head, .chapter .emergency').map(textOf),
      sources: {
        head: textOf(document.querySelector('#methods--sources thead tr')),
        rows: all('#methods--sources tbody tr').map(textOf),
      },
    };
  });
  const pdf = await getDocumentProxy(Uint8Array.from(file));
  const pages: string[] = [];
  for (let number = 1; number <= pdf.numPages; number += 1) {
    const { items } = await (await pdf.getPage(number)).getTextContent();
    pages.push(
      items
        .map((item) => ('str' in item ? item.str : ''))
        .join('')
        .replace(/\s+/g, ''),
    );
  }
  const outline = (await pdf.getOutline()).flatMap(({ title, items }) => [
    title,
    ...items.map((item: { title: string }) => item.title),
  ]);
  printed = { pages, outline, ...seen };
});
afterAll(() => browser?.close());

const without = (text: string) => text.replace(/\s+/g, '');
const { id } = JSON.parse(readFileSync(join(site, 'edition.json'), 'utf8'));

describe('the handbook printed as one document', () => {
  test('the contents name the page that a chapter begins on, and its head names the chapter', () => {
    expect(printed.contents.map(({ title }) => title)).toHaveLength(CHAPTERS.length);
    const starts = printed.contents.map(({ number }) => number);
    expect(starts).toEqual([...starts].sort((a, b) => a - b));
    printed.contents.forEach(({ title, number }, index) => {
      const end = starts[index + 1] ?? printed.pages.length + 1;
      for (let page = number; page < end; page += 1) {
        expect(printed.pages[page - 1], `page ${page}`).toContain(title);
      }
    });
  });

  test('every page but the cover says which edition it is of and its number, and none is blank', () => {
    const total = printed.pages.length;
    expect(total).toBeGreaterThan(CHAPTERS.length + 2);
    printed.pages.forEach((text, index) => {
      expect(text.length, `page ${index + 1} holds something`).toBeGreaterThan(150);
      if (index === 0) return;
      expect(text).toContain(`Edition${id}`);
      expect(text).toContain(`${index + 1}of${total}`);
    });
    expect(printed.pages[0]).toContain(id);
  });

  test('no row of a table and no caution is parted', () => {
    const parted = [...printed.rows, ...printed.blocks].filter(
      (text) => !printed.pages.some((page) => page.includes(text)),
    );
    expect(parted).toEqual([]);
    expect(printed.rows.length).toBeGreaterThan(150);
    expect(printed.blocks.length).toBeGreaterThan(8);
  });

  test('a table that goes on repeats its head', () => {
    const { head, rows } = printed.sources;
    const pages = printed.pages.filter((page) => rows.some((row) => page.includes(row)));
    expect(pages.length).toBeGreaterThan(1);
    for (const page of pages) expect(page).toContain(head);
  });

  test('it can be gone through by its headings', () => {
    const named = printed.outline.map(without);
    const missing = printed.contents.filter(
      ({ title }) => !named.some((name) => title.endsWith(name)),
    );
    expect(missing).toEqual([]);
  });
});

describe('the document as a page', () => {
  const html = readFileSync(join(site, 'print.html'), 'utf8');

  test('no id is there twice, and no chapter is empty', () => {
    const ids = [...html.matchAll(/ id="([^"]*)"/g)].map(([, name]) => name);
    expect(ids.filter((name, index) => ids.indexOf(name) !== index)).toEqual([]);
    expect(
      html.match(/<article class="chapter" id="[^"]*" data-page="[^"]*">\s*<header/g),
    ).toHaveLength(html.match(/data-page="/g)?.length ?? 0);
  });

  test('the search does not find it', () => {
    expect(html.includes('data-pagefind')).toBe(false);
  });

  test('links between chapters stay in it', () => {
    const chapters = html.slice(html.indexOf('<article'));
    const pages = [...html.matchAll(/data-page="([^"]*)"/g)].map(([, page]) => page);
    const leaving = [...chapters.matchAll(/href="([^"#]*)/g)].map(([, page]) => page);
    expect(leaving.filter((page) => pages.includes(page))).toEqual([]);
    expect(chapters).toContain('href="#fats-olive"');
  });
});
