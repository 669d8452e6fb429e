import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { pathToFileURL } from 'node:url';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, inject, test } from 'vitest';
import { launch } from './launch.ts';

const site = inject('site');
const edition = JSON.parse(readFileSync(join(site, 'edition.json'), 'utf8'));
const [first, second] = edition.formulas;
const digest: string = first.digests.pilot;
let browser: Browser;
let page: Page;

beforeAll(async () => {
  browser = await launch();
  page = await browser.newPage();
  await page.goto(`${pathToFileURL(site).href}/check.html`);
});
afterAll(() => browser?.close());

async function answer(code: string, typed: string): Promise<string> {
  await page.fill('#check-code', code);
  await page.fill('#check-digest', typed);
  await page.press('#check-digest', 'Enter');
  return (await page.textContent('#check-answer')) ?? '';
}

describe('check a sheet, opened as a file', () => {
  test.each([
    ['as printed', first.code, digest],
    ['in capitals', first.code.toLowerCase(), digest.toUpperCase()],
    ['without dashes', first.code.replace('-', ''), digest.replaceAll('-', '')],
    ['with spaces', ` ${first.code} `, digest.replaceAll('-', ' ')],
  ])('%s it is current', async (_, code, typed) => {
    expect(await answer(code, typed)).toMatch(/^Current\./);
  });

  test('one wrong symbol is found, wherever it stands', async () => {
    const bare = digest.replaceAll('-', '');
    for (let place = 0; place < bare.length; place++) {
      const wrong = bare[place] === '7' ? '8' : '7';
      const typed = bare.slice(0, place) + wrong + bare.slice(place + 1);
      expect(await answer(first.code, typed)).toMatch(/^The digest has a symbol that is wrong/);
    }
  });

  test('the digest of another formula is told from one that nobody knows', async () => {
    expect(await answer(second.code, digest)).toMatch(/^The digest is that of another formula/);
    // a fingerprint is sound by its check symbol, but no sheet bears it as its weights digest
    expect(await answer(first.code, first.fingerprint)).toMatch(/^Unknown\./);
    expect(await answer('', '')).toMatch(/^Type both/);
  });
});

test('the list on paper has every current digest', async () => {
  const listed = await page.locator('.digests td.code').allTextContents();
  const wanted = edition.formulas.flatMap((entry: { digests: Record<string, string | null> }) =>
    Object.values(entry.digests).filter((value) => value !== null),
  );
  expect(listed.toSorted()).toEqual(wanted.toSorted());
});
