import { pathToFileURL } from 'node:url';
import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, expect, inject, test } from 'vitest';
import { launch } from '../browser/launch.ts';
import { faultsOf, onePageOfEachKind } from '../support/axe-faults.ts';
import { sitePages } from '../support/site-files.ts';

const site = inject('site');
const pages = sitePages(site);
const base = `${pathToFileURL(site).href}/`;
let browser: Browser;
beforeAll(async () => {
  browser = await launch();
});
afterAll(() => browser?.close());

test('one page of each kind: axe finds nothing, and nothing scrolls sideways on a phone', {
  timeout: 120_000,
}, async () => {
  const found: string[] = [];
  for (const path of onePageOfEachKind(pages)) {
    // the colours are those of the demo, where they are looked at
    const faults = await faultsOf(browser, site, path, 'light', 360, { colours: false });
    found.push(...faults.map((fault) => `${path}: ${fault}`));
  }
  expect(found).toEqual([]);
});

// only one formula has “caolín”
test.each(['caolín', 'caolin', 'caolines', 'CAOLÍN'])(
  'the find page finds the formula by %s',
  async (word) => {
    const page = await browser.newPage();
    await page.goto(`${base}find.html`);
    await page.locator('#find-words').fill(word);
    await page.locator('#find-pages-list li').first().waitFor();
    await page.getByText('1 de 3 fórmulas').waitFor();
    expect(await page.locator('.find-table tbody .code').allInnerTexts()).toEqual(['TC-201']);
    expect(await page.locator('#find-pages-list mark').first().textContent()).toMatch(/^caol/i);
    await page.close();
  },
);

test('the shopping list adds up in pounds and ounces', async () => {
  const page = await browser.newPage();
  await page.goto(`${base}shopping.html`);
  await page.locator('#shopping-form input').first().fill('2');
  const cells = await page.locator('#shopping-list td.n').allInnerTexts();
  expect(cells.length).toBeGreaterThan(3);
  for (const cell of cells) expect(cell).toMatch(/^\d+\slb\s(\d|1[0-5])\.\d\soz$/);
  await page.close();
});

test('a typed size is read and weighed in pounds and ounces', async () => {
  const page = await browser.newPage();
  await page.goto(`${base}formulas/TC-201.html`);
  await page.locator('[data-way="fats"]').fill('3 lb 8 oz');
  await page.locator('#any-size-weights tr[data-material="olive"]').waitFor();
  // half of 56 oz
  const weight = page.locator('#any-size-weights tr[data-material="olive"] td.n');
  expect((await weight.textContent())?.replace(/\s+/g, ' ').trim()).toBe('1 lb 12.00 oz');
  await page.close();
});

test('every sheet is one leaf of Letter', async () => {
  const page = await browser.newPage();
  const session = await page.context().newCDPSession(page);
  const wrong: string[] = [];
  for (const path of pages.filter((each) => each.startsWith('sheets/'))) {
    await page.goto(base + path);
    const { data } = await session.send('Page.printToPDF', { paperWidth: 8.5, paperHeight: 11 });
    const pdf = Buffer.from(data, 'base64').toString('latin1');
    const sides = pdf.match(/\/Type\s*\/Page\b(?!s)/g)?.length;
    if (sides !== 2) wrong.push(`${path} takes ${sides} pages`);
  }
  expect(wrong).toEqual([]);
  await page.close();
});
