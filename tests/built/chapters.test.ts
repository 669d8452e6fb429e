import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { expect, inject, test } from 'vitest';
import { chapterHtml } from '../../src/handbook/book/chapter-html.ts';
import { asTree, chapterByTree } from '../support/chapter-by-tree.ts';
import { sitePages } from '../support/site-files.ts';

/** Kinds of pages by their folder; one of each is enough, as all of a kind are made from one template. */
const kindOf = (page: string) => page.replace(/[^/]*$/, '') || page;

test('a page of every kind is the chapter that its tree gives', () => {
  const site = inject('site');
  const html = (page: string) => readFileSync(join(site, page), 'utf8');
  const pages = sitePages(site).filter(
    (page) => page !== 'print.html' && html(page).includes('<main'),
  );
  const chapters = new Map(
    pages.map((page) => [
      page,
      { page, id: page.replace('.html', '').replaceAll('/', '-'), title: '', across: false },
    ]),
  );
  const seen = new Set<string>();
  for (const [page, chapter] of chapters) {
    if (seen.has(kindOf(page))) continue;
    seen.add(kindOf(page));
    expect(asTree(chapterHtml(html(page), chapter, chapters)), page).toBe(
      chapterByTree(html(page), chapter, chapters),
    );
  }
  expect(seen.size).toBeGreaterThan(10);
});
