import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, inject, test } from 'vitest';
import { siteFiles, sitePages } from '../support/site-files.ts';

const site = inject('site');
const textOf = (path: string) =>
  readFileSync(join(site, path), 'utf8')
    .replace(/<[^>]+>/g, ' ')
    .replaceAll('&lt;', '<')
    .replaceAll('&amp;', '&')
    .replace(/\s+/g, ' ');

test('the safety page prints each of its codes with the official wording', () => {
  const published = readFileSync('tests/words/clp-statements.txt', 'utf8')
    .split('\n')
    .filter((line) => /^(H|P|EUH)\d/.test(line))
    .map((line) => line.split('\t') as [string, string]);
  const text = textOf('safety.html');
  const shown = published.filter(([code]) =>
    new RegExp(`${code.replaceAll('+', '\\+')} `).test(text),
  );
  for (const [code, wording] of shown) expect(text).toContain(`${code} ${wording}`);
  expect(shown.map(([code]) => code)).toEqual(
    expect.arrayContaining(['H290', 'H302', 'H314', 'P280', 'P305+P351+P338', 'P310']),
  );
});

describe('the safety page is reached from every page', () => {
  // the page of a lost reader stands alone: it cannot know its place
  test.each(sitePages(site).filter((path) => path !== '404.html' && !/^cards\//.test(path)))(
    '%s',
    (path) =>
      expect(readFileSync(join(site, path), 'utf8')).toMatch(/href="(\.\.\/)*safety\.html"/),
  );
});

test('an edition that was not asked for costs holds none, in no file', () => {
  // the currency and the dearest price of the demonstration's prices.yaml
  const found = siteFiles(site).filter((path) =>
    /\bXTS\b|14\.53|perKilogram":\[/.test(readFileSync(join(site, path), 'latin1')),
  );
  expect(found).toEqual([]);
});

test('the shopping page gives every batch its table without a script', () => {
  const html = readFileSync(join(site, 'shopping.html'), 'utf8');
  const codes = [...html.matchAll(/id="takes-([^"]+)"/g)].map(([, code]) => code);
  expect(codes.length).toBeGreaterThan(30);
  expect(textOf('shopping.html')).toMatch(/Sodium hydroxide \d+\.\d{3} kg/);
});
