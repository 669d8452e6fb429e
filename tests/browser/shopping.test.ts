import { pathToFileURL } from 'node:url';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, inject, test } from 'vitest';
import { launch } from './launch.ts';

const address = `${pathToFileURL(inject('site')).href}/shopping.html`;
let browser: Browser;
let page: Page;

beforeAll(async () => {
  browser = await launch();
});
afterAll(() => browser?.close());

/** Kilograms of each material, as the page shows them. */
async function listed(): Promise<Readonly<Record<string, number>>> {
  const rows = await page.locator('#shopping-list tbody tr').all();
  const entries = await Promise.all(
    rows.map(async (row) => [
      (await row.locator('th').textContent()) ?? '',
      Number.parseFloat((await row.locator('td').first().textContent()) ?? ''),
    ]),
  );
  return Object.fromEntries(entries);
}

const field = (batch: string) => page.getByLabel(batch);

describe('the shopping list, opened from a folder', () => {
  beforeAll(async () => {
    page = await browser.newPage();
    await page.goto(address);
  });

  test('begins empty and adds up what is typed', async () => {
    expect(await page.locator('#shopping-list').textContent()).toBe('Nothing chosen yet.');
    await field('QY-014 Harbour Lamp, Pilot: how many').fill('1');
    const one = await listed();
    // 45, 25, 25 and 5 % of 1 kg of fats
    expect(one).toMatchObject({ 'Olive oil': 0.45, 'Coconut oil': 0.25, 'Castor oil': 0.05 });
    await field('QY-014 Harbour Lamp, Pilot: how many').fill('3');
    const three = await listed();
    for (const [name, kilograms] of Object.entries(one)) {
      // each is shown to the gram
      expect(Math.abs((three[name] ?? 0) - 3 * kilograms), name).toBeLessThan(0.0021);
    }
  });

  test('keeps the choice in its address, and takes it from there', async () => {
    expect(new URL(page.url()).hash).toBe('#QY-014.pilot=3');
    const before = await listed();
    await page.goto('about:blank');
    await page.goto(`${address}#QY-014.pilot=3&QY-999.pilot=4`);
    expect(await listed()).toEqual(before);
  });

  test('starts again', async () => {
    await page.getByRole('button', { name: 'Start again' }).click();
    expect(await page.locator('#shopping-list table').count()).toBe(0);
    expect(new URL(page.url()).hash).toBe('');
  });

  test('prints the list and neither the form nor the tables of all batches', async () => {
    await page.goto(`${address}#QY-001.pilot=2`);
    await page.emulateMedia({ media: 'print' });
    expect(await page.locator('#shopping-list table').isVisible()).toBe(true);
    expect(await page.locator('#shopping-choose').isVisible()).toBe(false);
    expect(await page.locator('#shopping-batches').isVisible()).toBe(false);
    await page.close();
  });
});

test('with scripts off every batch has its table, on paper too', async () => {
  const context = await browser.newContext({ javaScriptEnabled: false });
  page = await context.newPage();
  await page.goto(address);
  await page.emulateMedia({ media: 'print' });
  expect(await page.locator('#shopping-choose').isVisible()).toBe(false);
  expect(await page.locator('#takes-QY-014').textContent()).toContain('0.450 kg');
  await context.close();
});
