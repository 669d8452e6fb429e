import { pathToFileURL } from 'node:url';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, expect, inject, test } from 'vitest';
import { launch } from './launch.ts';

const site = inject('site');
let browser: Browser;
let page: Page;
beforeAll(async () => {
  browser = await launch();
  page = await browser.newPage();
});
afterAll(() => browser?.close());

/** What a screen reader is told of a part of a page. */
async function heard(path: string, part: string): Promise<string> {
  const address = `${pathToFileURL(site).href}/${path}`;
  if (page.url() !== address) await page.goto(address, { waitUntil: 'load' });
  return page.locator(part).first().ariaSnapshot();
}

test('weights are a table that names formula and size, with heads that say the unit in words', async () => {
  const weights = await heard('formulas/QY-018.html', '.batch');
  expect(weights).toContain(`table "QY-018, Pilot: what to weigh, in working order"`);
  expect(weights).toContain('columnheader "Weight, in grams"');
  expect(weights).toMatch(/rowheader "Lye"/);
  expect(weights).toMatch(/rowheader "Sodium hydroxide lot NA-07"\s+- cell "140\.2 g"/);
});

test('so are those of a bench sheet', async () => {
  const sheet = await heard('sheets/QY-018-pilot.html', '.weigh');
  expect(sheet).toMatch(/table "Weigh each into a cup of its own, in this order/);
  expect(sheet).toContain('columnheader "Weigh in grams"');
  expect(sheet).toMatch(/rowheader "Sodium hydroxide lot NA-07"\s+- cell "140\.2 g"/);
});

test('in a lye table heads stand over the cells, or on a narrow screen in them', async () => {
  const wide = await heard('lye/pilot.html', '.lye');
  expect(wide).toContain('table "Lye table: Pilot, in grams"');
  expect(wide).toContain('columnheader "Sodium hydroxide"');
  expect(wide).toMatch(/cell "Goat Loft"\s+- cell "140\.2 g"/);
  await page.setViewportSize({ width: 360, height: 780 });
  const narrow = await heard('lye/pilot.html', '.lye');
  await page.setViewportSize({ width: 1280, height: 900 });
  expect(narrow).toContain('table "Lye table: Pilot, in grams"');
  expect(narrow).not.toContain('columnheader');
  expect(narrow).toMatch(
    /cell "Goat Loft"\s+- cell "Sodium hydroxide 140\.2 g"\s+- cell "Water 163\.6 g"/,
  );
});

test('the picture of the margin is told in figures, with what they mean after it', async () => {
  const margin = await heard('formulas/QY-018.html', '#margin');
  expect(margin).toMatch(
    /img "Superfat written 6 %\. Expanded interval 4\.4 to 7\.6 %\. Worst case 4\.0 to 8\.0 %\."/,
  );
  expect(margin).toContain('no free alkali is expected from the spread of the materials');
});

test('the chart of acids is a table of shares, without its bars', async () => {
  const chart = await heard('formulas/QY-018.html', '.chart');
  expect(chart).toContain('table "Acid profile"');
  expect(chart).toMatch(
    /row "oleic acid C18:1 46\.3 %":\s+- rowheader "oleic acid C18:1"\s+- cell/,
  );
  expect(chart).not.toContain('img');
});

test('a caution begins with how grave it is', async () => {
  for (const [path, most] of [
    ['formulas/QY-018.html', 'Care'],
    ['sheets/QY-018-pilot.html', 'Care'],
  ] as const) {
    const part = path.startsWith('sheets') ? '.cautions' : '#cautions';
    expect(await heard(path, part)).toMatch(
      new RegExp(`(listitem|article):\\s+- paragraph: "?${most}\\. `),
    );
  }
});

test('the finder names its table, its fields with their property, and its pictures', async () => {
  const results = await heard('find.html', '#find-results');
  expect(results).toContain('status: 34 of 34 formulas');
  expect(results).toContain('table "Formulas"');
  expect(results).toMatch(/img "saturated [\d.]+ %, monounsaturated [\d.]+ %, polyunsaturated/);
  const field = await heard('find.html', '[data-property="superfat"]');
  expect(field).toContain('spinbutton "Superfat, as written, at least"');
  expect(field).toContain('spinbutton "Superfat, as written, at most"');
  // the strip says by marks what the fields and the count say in words
  expect(field).not.toContain('img');
});
