import { cpSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, expect, inject, test } from 'vitest';
import { sealEdition } from '../../src/edition/seal-fs.ts';
import { launch } from './launch.ts';
import { serve } from './serve.ts';

const site = inject('site');
/** Enough of a handbook for a copy to be taken of. */
const FILES = [
  'assets',
  'icons',
  'index.html',
  'mark.svg',
  'manifest.webmanifest',
  'kept-copy-worker.js',
  'not-kept.html',
  'formulas/QY-014.html',
  'sheets/QY-014-pilot.html',
  'working/QY-014.html',
  'working/QY-015.html',
];
const FORMULA = 'formulas/QY-014.html';
const SHEET = 'sheets/QY-014-pilot.html';
const BASE = '/shop/handbook/';
const edition = JSON.parse(readFileSync(join(site, 'edition.json'), 'utf8'));
const NEXT = 'next-next-next-n';
/** The weight of the first fat in the pilot batch, and what it becomes in the next edition. */
const [OLD, NEW] = ['450.0', '461.5'];

const folder = mkdtempSync(join(tmpdir(), 'handbook-'));
let browser: Browser;
let server: Awaited<ReturnType<typeof serve>>;
let page: Page;

beforeAll(async () => {
  for (const file of FILES) cpSync(join(site, file), join(folder, file), { recursive: true });
  sealEdition(folder, edition);
  browser = await launch();
  server = await serve(folder, BASE);
  page = await browser.newPage({ viewport: { width: 360, height: 740 } });
});
afterAll(async () => {
  await browser.close();
  await server.close();
  rmSync(folder, { recursive: true });
});

const open = (path: string) => page.goto(server.origin + path, { waitUntil: 'load' });
const away = () => server.close();
async function back() {
  server = await serve(folder, BASE, server.port);
}

/** What the notice says once the copy has been held against the site. */
async function notice(state: 'current' | 'unchecked' | 'other'): Promise<string> {
  const found = page.locator(`#kept-copy[data-state="${state}"] #kept-text`);
  await found.waitFor({ state: 'visible' });
  return (await found.textContent()) ?? '';
}
const weights = (path: string) =>
  open(path).then(() => page.locator('tr[data-material="olive"]').first().textContent());

function replaceIn(path: string, what: string, by: string): void {
  const file = join(folder, path);
  writeFileSync(file, readFileSync(file, 'utf8').replaceAll(what, by));
}

test('the first page comes from the site; then a copy of the edition stands on the device', async () => {
  await open('index.html');
  expect(await page.locator('#kept-copy').isVisible()).toBe(false);
  await page.evaluate(async () => {
    const { active } = await navigator.serviceWorker.ready;
    while (active?.state !== 'activated') await new Promise((resolve) => setTimeout(resolve, 20));
  });
  expect(await weights(FORMULA)).toContain(OLD);
  expect(await notice('current')).toContain(edition.id);
});

test('it can be installed: name, icons and the place to start are found', async () => {
  const address = await page.locator('link[rel="manifest"]').getAttribute('href');
  const manifest = JSON.parse(readFileSync(join(folder, 'manifest.webmanifest'), 'utf8'));
  expect(new URL(address ?? '', page.url()).href).toBe(`${server.origin}manifest.webmanifest`);
  const session = await page.context().newCDPSession(page);
  const { errors, data } = await session.send('Page.getAppManifest');
  expect(errors).toEqual([]);
  expect(JSON.parse(data ?? '')).toEqual(manifest);
  const { installabilityErrors } = await session.send('Page.getInstallabilityErrors');
  // a window of its own profile can never install
  expect(installabilityErrors.filter(({ errorId }) => errorId !== 'in-incognito')).toEqual([]);
});

test('without a network pages open that were never read, and say what they are', async () => {
  await away();
  expect(await weights(SHEET)).toContain(OLD);
  expect(await notice('unchecked')).toContain(edition.id);
  await open('working/QY-014.html');
  expect(page.url()).toBe(`${server.origin}not-kept.html`);
  await back();
});

test('a page that is kept later is there once it was read', async () => {
  await open('working/QY-014.html');
  await notice('current');
  await away();
  await open('working/QY-014.html');
  expect(page.url()).toContain('working/QY-014.html');
  await notice('unchecked');
  await back();
});

test('another edition of the site is said on every page, and changes nothing by itself', async () => {
  for (const path of [FORMULA, SHEET]) replaceIn(path, OLD, NEW);
  replaceIn('working/QY-015.html', '<h1>', '<h1>Next ');
  cpSync(join(folder, FORMULA), join(folder, 'formulas/QY-099.html'));
  sealEdition(folder, { ...edition, id: NEXT, asOf: '2026-12-24' });
  for (const path of [FORMULA, SHEET]) {
    expect(await weights(path)).toContain(OLD);
    const said = await notice('other');
    expect(said).toContain(edition.id);
    expect(said).toContain(NEXT);
    expect(said).toContain('24 Dec 2026');
  }
});

test('no page of the other edition comes between those of the copy', async () => {
  for (const path of ['formulas/QY-099.html', 'working/QY-015.html']) {
    await open(path);
    expect(page.url(), path).toBe(`${server.origin}not-kept.html`);
    expect(await notice('other')).toContain(NEXT);
  }
});

test('an edition that arrives in part is not taken; the copy stays whole', async () => {
  const whole = readFileSync(join(folder, SHEET));
  replaceIn(SHEET, NEW, '999.9');
  await open(FORMULA);
  await notice('other');
  await page.locator('#kept-take').click();
  await page.getByText('could not be taken whole').waitFor();
  expect(await weights(FORMULA)).toContain(OLD);
  expect(await weights(SHEET)).toContain(OLD);
  writeFileSync(join(folder, SHEET), whole);
});

test('the edition is taken as a whole, and the one before is gone', async () => {
  await open(FORMULA);
  await notice('other');
  await page.locator('#kept-take').click();
  expect(await notice('current')).toContain(NEXT);
  await away();
  expect(await weights(FORMULA)).toContain(NEW);
  expect(await weights(SHEET)).toContain(NEW);
  expect(await notice('unchecked')).toContain(NEXT);
  const copies = await page.evaluate(() => caches.keys());
  expect(copies).toHaveLength(2);
  await back();
});

test('what a network puts in the place of an answer is no edition', async () => {
  writeFileSync(join(folder, 'kept-copy.json'), '<html>Sign in to this network</html>');
  await open(FORMULA);
  expect(await notice('unchecked')).toContain(NEXT);
});
