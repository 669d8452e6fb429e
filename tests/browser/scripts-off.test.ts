import { pathToFileURL } from 'node:url';
import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, inject, test } from 'vitest';
import { PAGES_OF_KINDS } from '../support/page-kinds.ts';
import { launch } from './launch.ts';

const site = inject('site');
const base = `${pathToFileURL(site).href}/`;
let browser: Browser;
beforeAll(async () => {
  browser = await launch();
});
afterAll(() => browser?.close());

/** What a page with a script keeps without it, beside a sentence that says what does not work. */
const KEPT: Readonly<Record<string, string>> = {
  'find.html': '#lists a',
  'check.html': '.digests tbody tr',
  'shopping.html': '.shopping-batch tbody tr',
};

test('with scripts off every page says what it has, and offers nothing that does not work', async () => {
  const page = await browser.newPage({ javaScriptEnabled: false });
  const wrong: string[] = [];
  for (const path of PAGES_OF_KINDS) {
    await page.goto(base + path);
    if (((await page.locator('main').textContent()) ?? '').length < 50)
      wrong.push(`${path} says nothing`);
    const dead = await page
      .locator('form, button, input, select')
      .filter({ visible: true })
      .count();
    if (dead > 0) wrong.push(`${path} offers ${dead} dead controls`);
    const kept = KEPT[path];
    if (kept === undefined) continue;
    const told = page.locator('.notice', { hasText: /\bscripts\b/ }).filter({ visible: true });
    if ((await told.count()) === 0) wrong.push(`${path} does not say that it needs scripts`);
    if ((await page.locator(kept).filter({ visible: true }).count()) === 0) {
      wrong.push(`${path} keeps nothing`);
    }
  }
  await page.close();
  expect(wrong).toEqual([]);
});

describe('a browser that is too old to unpack the search', () => {
  test('says so, whatever the address asks for, and keeps limits and lists', async () => {
    const page = await browser.newPage();
    const errors: Error[] = [];
    page.on('pageerror', (error) => errors.push(error));
    await page.addInitScript(() => {
      Reflect.deleteProperty(globalThis, 'DecompressionStream');
    });
    await page.goto(`${base}find.html#words=olive&superfat=..5`);
    const note = page.locator('#find-words-note');
    await note.filter({ hasText: 'too old to search by word' }).waitFor();
    expect(await page.locator('#find-words').isDisabled()).toBe(true);
    expect(await page.locator('#find-broken').isVisible()).toBe(false);
    expect(await page.locator('#find-table tbody tr').count()).toBeGreaterThan(5);
    await page.getByLabel('Superfat, as written, at most').fill('3');
    await page.locator('#find-count', { hasText: /^\d of/ }).waitFor();
    expect(await page.locator('#lists a').count()).toBeGreaterThan(10);
    expect(errors).toEqual([]);
    await page.close();
  });
});
