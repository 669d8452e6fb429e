import { readFileSync } from 'node:fs';
import { dirname, join, posix } from 'node:path';
import { gzipSync } from 'node:zlib';
import { describe, expect, inject, test } from 'vitest';
import { siteFiles, sitePages } from '../support/site-files.ts';

// Budgets in bytes, compressed as a plain web server does it. A maker's telephone is old and far from the router.
const FORMULA_PAGE = 20_000;
const FONTS = 80_000;
const SCRIPTS = 10_000;
const SCRIPTS_OF_THE_FINDER = 20_000;
/** The sheet of any size carries the core and the corrections; a shop that does not turn it on has none of it. */
const SCRIPTS_OF_ANY_SIZE = 13_000;

const site = inject('site');
const read = (path: string) => readFileSync(join(site, path));
const compressed = (path: string) => gzipSync(read(path)).length;
const total = (sizes: readonly number[]) => sizes.reduce((sum, size) => sum + size, 0);

/** Files that a page names in an attribute of a tag, from the root of the site. */
function named(page: string, tag: RegExp): readonly string[] {
  return [...read(page).toString().matchAll(tag)].map(([, link = '']) =>
    posix.normalize(posix.join(dirname(page), link)),
  );
}
const styles = (page: string) => named(page, /<link[^>]*rel="stylesheet"[^>]*href="([^"]+)"/g);
const scripts = (page: string) => named(page, /<script[^>]*src="([^"]+)"/g);

const budgetOf = (page: string) =>
  page === 'find.html'
    ? SCRIPTS_OF_THE_FINDER
    : page.startsWith('sizes/')
      ? SCRIPTS_OF_ANY_SIZE
      : SCRIPTS;

const pages = sitePages(site);
const formulas = pages.filter((path) => path.startsWith('formulas/'));

test('there are formula pages and fonts to weigh', () => {
  expect(formulas.length).toBeGreaterThan(30);
  expect(formulas.every((page) => styles(page).length > 0)).toBe(true);
});

test.each(formulas)('%s with its style is light', (page) => {
  const size = compressed(page) + total(styles(page).map(compressed));
  expect(size).toBeLessThan(FORMULA_PAGE);
});

test('all pages share a few small fonts', () => {
  const fonts = siteFiles(site).filter((path) => /\.(woff2?|ttf|otf)$/.test(path));
  expect(fonts.length).toBeGreaterThan(0);
  expect(total(fonts.map((path) => read(path).length))).toBeLessThan(FONTS);
});

describe('scripts', () => {
  test('no page waits for one before it shows what it says', () => {
    for (const page of pages) {
      for (const [tag] of read(page)
        .toString()
        .matchAll(/<script[^>]*>/g)) {
        expect(tag, page).toMatch(/\sdefer\b/);
      }
    }
  });

  test('those of a page are small', () => {
    for (const page of pages) {
      const own = scripts(page).filter((path) => path.startsWith('assets/'));
      expect(total(own.map(compressed)), page).toBeLessThan(budgetOf(page));
    }
  });
});
