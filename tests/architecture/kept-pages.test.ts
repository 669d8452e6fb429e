import { readdirSync, readFileSync } from 'node:fs';
import { dirname, join, posix, sep } from 'node:path';
import { fileURLToPath } from 'node:url';
import { expect, test } from 'vitest';

const SRC = fileURLToPath(new URL('../../src', import.meta.url));
const WIDE = 'site/input.ts';

const read = (path: string) => readFileSync(join(SRC, path), 'utf8');

const importsOf = (path: string) =>
  [...read(path).matchAll(/(?:from|import)\s*\(?\s*['"](\.[^'"]+)['"]/g)].map(([, name = '']) =>
    posix.join(dirname(path), name.replace(/\?.*$/, '')),
  );

const PAGES = readdirSync(join(SRC, 'site/pages'), { recursive: true, encoding: 'utf8' })
  .map((path) => `site/pages/${path.split(sep).join('/')}`)
  .filter((path) => /\.(astro|ts)$/.test(path));
const KEPT = PAGES.filter((path) => read(path).includes('keptPath('));

test('the pages of a formula are kept', () => {
  expect(KEPT.sort()).toEqual([
    'site/pages/formulas/[code].astro',
    'site/pages/sheets/[sheet].astro',
    'site/pages/sizes/[code].astro',
    'site/pages/working/[code].astro',
  ]);
});

test.each(KEPT)('nothing under %s can read the whole formulary', (page) => {
  const reached = new Set<string>();
  const open = importsOf(page).filter((path) => path !== WIDE);
  for (let path = open.pop(); path !== undefined; path = open.pop()) {
    if (reached.has(path) || !/\.(astro|ts)$/.test(path)) continue;
    reached.add(path);
    open.push(...importsOf(path));
  }
  expect(reached.size).toBeGreaterThan(20);
  expect([...reached]).not.toContain(WIDE);
});

test.each(KEPT)('%s asks for it to know its paths alone', (page) => {
  const [, script = ''] = read(page).split(/^---$/m);
  const paths = /export function getStaticPaths\(\) \{\n[\s\S]*?\n\}\n/.exec(script)?.[0] ?? '';
  expect(paths).toContain('siteInput()');
  expect(read(page).replace(paths, '')).not.toContain('siteInput()');
});

test('no page is kept in another way', () => {
  for (const page of PAGES) expect(read(page), page).not.toContain('cacheKey');
});
