import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { pathToFileURL } from 'node:url';
import type { Browser, CDPSession, Page } from 'playwright-core';
import { afterAll, beforeAll, expect, inject, test } from 'vitest';
import type { FormulaDocument } from '../../src/formulary/document.ts';
import { launch } from './launch.ts';

const site = inject('site');
const documents = readdirSync(join(site, 'data/formulas')).map(
  (file): FormulaDocument => JSON.parse(readFileSync(join(site, 'data/formulas', file), 'utf8')),
);
const sheets = documents.flatMap((document) =>
  document.batches
    .filter(({ refused }) => !refused)
    .map((batch) => ({ document, batch, path: `sheets/${document.code}-${batch.id}.html` })),
);
/** Inches, as the protocol takes them. */
const PAPERS = { A4: [210 / 25.4, 297 / 25.4], Letter: [8.5, 11] } as const;

let browser: Browser;
let page: Page;
let session: CDPSession;

beforeAll(async () => {
  browser = await launch();
  page = await browser.newPage();
  session = await page.context().newCDPSession(page);
});
afterAll(() => browser?.close());

async function pagesPrinted(paper: keyof typeof PAPERS): Promise<number> {
  const [paperWidth, paperHeight] = PAPERS[paper];
  const { data } = await session.send('Page.printToPDF', { paperWidth, paperHeight });
  const pdf = Buffer.from(data, 'base64').toString('latin1');
  return pdf.match(/\/Type\s*\/Page\b(?!s)/g)?.length ?? 0;
}

test('there is a sheet for every batch with weights and for no other', () => {
  expect(readdirSync(join(site, 'sheets')).sort()).toEqual(
    sheets.map(({ path }) => path.slice('sheets/'.length)).sort(),
  );
  expect(sheets.length).toBeGreaterThan(50);
});

test('every sheet is one leaf on A4 and on Letter', { timeout: 240_000 }, async () => {
  const wrong: string[] = [];
  for (const { path } of sheets) {
    await page.goto(`${pathToFileURL(site).href}/${path}`, { waitUntil: 'load' });
    for (const paper of ['A4', 'Letter'] as const) {
      const count = await pagesPrinted(paper);
      if (count !== 2) wrong.push(`${path} takes ${count} pages of ${paper}`);
    }
  }
  expect(wrong).toEqual([]);
});

test('every weight of the published data stands on its sheet, and no other', {
  timeout: 120_000,
}, async () => {
  for (const { document, batch, path } of sheets) {
    await page.goto(`${pathToFileURL(site).href}/${path}`, { waitUntil: 'load' });
    const printed = await page
      .locator('.weigh tr[data-material]')
      .evaluateAll((rows) =>
        rows.map((row): [string, number] => [
          row.getAttribute('data-material') ?? '',
          Number.parseFloat(row.querySelector('.n')?.textContent ?? ''),
        ]),
      );
    const heldBack = batch.weighedHeldBack ?? 0;
    const expected: [string, number][] = [
      ...[...batch.alkali, ...batch.fats, ...batch.afterCookFats].map(
        ({ id, weighedMass }): [string, number] => [id, weighedMass],
      ),
      ...[...batch.liquids, ...batch.additives].map(({ id, weighedMass }): [string, number] => [
        id,
        weighedMass,
      ]),
      ['water', (batch.weighedWater ?? 0) - heldBack],
      ...(heldBack > 0 ? [['held-back', heldBack] satisfies [string, number]] : []),
    ];
    const sorted = (lines: readonly [string, number][]) =>
      lines.map(([id, mass]) => `${id} ${mass.toFixed(6)}`).sort();
    expect(sorted(printed), path).toEqual(sorted(expected));
    expect(await page.locator('.digest').allTextContents(), path).toEqual(
      expect.arrayContaining([expect.stringContaining(batch.digest ?? 'no digest')]),
    );
    expect(await page.locator('.title .code').allTextContents()).toEqual([
      document.code,
      document.code,
    ]);
  }
});

test('a sheet can be read on a phone without scrolling sideways', async () => {
  const phone = await browser.newPage({ viewport: { width: 360, height: 740 } });
  for (const { path } of sheets.slice(0, 12)) {
    await phone.goto(`${pathToFileURL(site).href}/${path}`, { waitUntil: 'load' });
    const [content, frame] = await phone.evaluate(() => [
      document.documentElement.scrollWidth,
      document.documentElement.clientWidth,
    ]);
    expect(content, path).toBeLessThanOrEqual(frame ?? 0);
  }
  await phone.close();
});
