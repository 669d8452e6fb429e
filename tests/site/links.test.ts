import { expect, test } from 'vitest';
import { idsOf, rewriteLinks } from '../../src/site/integrations/rewrite-links.ts';

const texts = new Map([
  ['index.html', '<h2 id="a">A</h2>'],
  ['formulas/TT-001.html', '<p id="weights">'],
  ['assets/page.css', ''],
  ['assets/font.woff2', ''],
]);
const files = new Set(texts.keys());
const rewrite = (file: string, text: string) =>
  rewriteLinks(file, text, files, (page) => idsOf(texts.get(page) ?? ''));

test('links become relative to their page', () => {
  expect(rewrite('formulas/TT-001.html', '<a href="/index.html#a">').rewritten).toBe(
    '<a href="../index.html#a">',
  );
  expect(rewrite('index.html', '<a href="/formulas/TT-001.html">').rewritten).toBe(
    '<a href="formulas/TT-001.html">',
  );
  expect(
    rewrite('index.html', '<img srcset="/assets/font.woff2 1x, /assets/page.css 2x">').rewritten,
  ).toBe('<img srcset="assets/font.woff2 1x, assets/page.css 2x">');
});

test('a page knows the way to its root', () => {
  expect(rewrite('index.html', '<html data-root="/">').rewritten).toBe('<html data-root="./">');
  expect(rewrite('formulas/TT-001.html', '<html data-root="/">').rewritten).toBe(
    '<html data-root="../">',
  );
});

test('style sheets find their fonts', () => {
  expect(rewrite('assets/page.css', 'src:url(/assets/font.woff2)').rewritten).toBe(
    'src:url(font.woff2)',
  );
});

test.each([
  ['<a href="/gone.html">', '/gone.html'],
  ['<a href="/formulas/TT-001.html#gone">', '/formulas/TT-001.html#gone'],
  ['<a href="#gone">', '#gone'],
])('%s leads nowhere', (text, link) => {
  expect(rewrite('index.html', text).missing).toEqual([link]);
});

test('other hosts, anchors that exist and plain text are left alone', () => {
  const text =
    '<a href="https://example.org/x"> <a href="#a"> <a href="mailto:a@example.org"> "/x"';
  expect(rewrite('index.html', text)).toEqual({ rewritten: text, missing: [] });
});
