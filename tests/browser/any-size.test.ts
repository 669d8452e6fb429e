import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { pathToFileURL } from 'node:url';
import { gzipSync } from 'node:zlib';
import type { Browser, Page } from 'playwright-core';
import { extractText } from 'unpdf';
import { afterAll, beforeAll, describe, expect, inject, test } from 'vitest';
import type { FormulaDocument } from '../../src/formulary/document.ts';
import { launch } from './launch.ts';
import { serve } from './serve.ts';

const site = inject('site');
const formula: FormulaDocument = JSON.parse(
  readFileSync(join(site, 'data/formulas/QY-014.json'), 'utf8'),
);
const pilot = formula.batches.find(({ id }) => id === 'pilot');
let browser: Browser;
let server: Awaited<ReturnType<typeof serve>>;

beforeAll(async () => {
  browser = await launch();
  server = await serve(site, '/shop/handbook/');
});
afterAll(async () => {
  await browser?.close();
  await server?.close();
});

/** Grams of each material, as the page shows them. */
const shown = (page: Page) =>
  page
    .locator('#any-size-weights tr[data-material]')
    .evaluateAll((rows) =>
      Object.fromEntries(
        rows.map((row): [string, number] => [
          row.getAttribute('data-material') ?? '',
          Number.parseFloat(row.querySelector('.n')?.textContent ?? ''),
        ]),
      ),
    );

const silent = (page: Page): string[] => {
  const wrong: string[] = [];
  page.on('pageerror', (error) => wrong.push(error.message));
  page.on('console', (message) => {
    if (message.type() === 'error') wrong.push(message.text());
  });
  return wrong;
};

describe.each(['file', 'http'])('any size, opened by %s', (how) => {
  let page: Page;
  let wrong: string[];
  const address = (path: string) =>
    how === 'file' ? `${pathToFileURL(site).href}/${path}` : `${server.origin}${path}`;

  beforeAll(async () => {
    page = await browser.newPage({ viewport: { width: 360, height: 740 } });
    wrong = silent(page);
    await page.goto(address('formulas/QY-014.html'));
  });
  afterAll(async () => {
    await page.close();
    expect(wrong).toEqual([]);
  });

  test('is typed by keyboard on the formula page and read there', async () => {
    await page.locator('[data-way="fats"]').focus();
    await page.keyboard.type('1000');
    const weights = await shown(page);
    expect(weights.olive).toBe(450);
    for (const { id, weighedMass } of [...(pilot?.fats ?? []), ...(pilot?.alkali ?? [])]) {
      expect(weights[id], id).toBeCloseTo(weighedMass, 6);
    }
    expect(await page.locator('#any-size-said').textContent()).toContain('listed size Pilot');
    // typing into the next field takes the place of the first
    await page.keyboard.press('Tab');
    await page.keyboard.type('2000');
    expect(await page.locator('[data-way="fats"]').inputValue()).toBe('');
    expect(Object.keys(await shown(page)).length).toBeGreaterThan(4);
    const [content, frame] = await page.evaluate(() => [
      document.documentElement.scrollWidth,
      document.documentElement.clientWidth,
    ]);
    expect(content).toBeLessThanOrEqual(frame ?? 0);
  });

  test('answers nonsense in a sentence, and sizes out of range in words', async () => {
    const field = page.locator('[data-way="fats"]');
    for (const nonsense of ['1e9', '-5', 'abc', '1,5', '\ud800', '0', '٣', 'NaN', '1 000']) {
      await field.fill(nonsense);
      expect(await page.locator('#any-size-weights').textContent(), nonsense).toBe('');
      expect((await page.locator('#any-size-said').textContent())?.length).toBeGreaterThan(10);
    }
    for (const [size, words] of [
      ['500', 'The smallest listed size'],
      ['99999', 'The largest listed size'],
    ] as const) {
      await field.fill(size);
      expect(await page.locator('#any-size-refused').textContent()).toContain(words);
      expect(await page.locator('#any-size-weights').textContent()).toBe('');
    }
    expect(await page.locator('#any-size').textContent()).not.toMatch(/NaN|undefined|Infinity/);
  });

  test('goes along to the sheet, which can be printed and says what it is', async () => {
    await page.locator('[data-way="fats"]').fill('1500');
    const weights = await shown(page);
    await page.locator('#any-size-link').press('Enter');
    await page.waitForURL(/sizes\/QY-014\.html#fats=1500$/);
    expect(await shown(page)).toEqual(weights);
    await page.emulateMedia({ media: 'print' });
    expect(await page.locator('#any-size-form').isVisible()).toBe(false);
    const text = await page.locator('#any-size-sheet').textContent();
    for (const words of ['Not a listed size', 'QY-014', '1500', formula.fingerprint ?? '?']) {
      expect(text).toContain(words);
    }
    await page.emulateMedia({ media: null });
    const { data } = await (await page.context().newCDPSession(page)).send('Page.printToPDF');
    const printed = await extractText(new Uint8Array(Buffer.from(data, 'base64')));
    expect(printed.totalPages).toBeGreaterThan(1);
    for (const leaf of printed.text) expect(leaf).toContain('Not a listed size');
  });

  test('puts a slip right, or stops the batch', async () => {
    await page.goto(address('sizes/QY-014.html#listed=pilot'));
    const olive = page.getByLabel('Olive oil: scale showed');
    // an empty cup, as the scale shows it
    await olive.fill('0.0');
    expect(await page.locator('#correction-todo').textContent()).toContain('Add 450');
    // alone in its cup: what is too much is taken back
    await olive.fill('460');
    const todo = page.locator('#correction-todo');
    expect(await todo.textContent()).toContain('Take back 10');
    // in the pot: everything else grows by 460/450
    await page.getByLabel('Olive oil: in with others').check();
    const weights = await shown(page);
    expect(weights.olive).toBe(460);
    expect(weights.coconut).toBeCloseTo((250 * 460) / 450, 0);
    expect(await page.locator('#correction-said').textContent()).toContain('the batch grows by');
    await page.getByLabel('Lye and fats have met').check();
    expect(await todo.textContent()).toContain('Stop. No weights.');
    expect(await shown(page)).toEqual({});
    // what has met stays stopped, whatever is typed after it
    await olive.fill('4x');
    expect(await todo.textContent()).toContain('Stop. No weights.');
    expect(await shown(page)).toEqual({});
  });
});

test('the scripts of any size on a formula page are under 10 kB on the wire', () => {
  const page = readFileSync(join(site, 'formulas/QY-014.html'), 'utf8');
  const scripts = [...page.matchAll(/<script[^>]*\ssrc="([^"]+)"/g)]
    .map(([, src = '']) => src)
    // the line in which every page offers a copy to keep counts in the budget of all pages
    .filter((src) => !src.includes('/kept-'))
    .map((src) => readFileSync(join(site, 'formulas', src)));
  expect(scripts.length).toBe(2);
  const size = scripts.reduce((sum, script) => sum + gzipSync(script).length, 0);
  expect(size).toBeLessThan(10_000);
});
