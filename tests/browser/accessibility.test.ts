import { pathToFileURL } from 'node:url';
import axe from 'axe-core';
import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, inject, test } from 'vitest';
import { sitePages } from '../support/site-files.ts';
import { launch } from './launch.ts';

const site = inject('site');
const pages = sitePages(site);

/**
 * One page of each kind: the first of every folder, and every page that stands alone. The document to print is made
 * of such pages and too long for axe.
 */
const KINDS = pages.filter((path, index) => {
  if (path === 'print.html') return false;
  const folder = path.split('/').slice(0, -1).join('/');
  return folder === '' || !pages.slice(0, index).some((other) => other.startsWith(`${folder}/`));
});

let browser: Browser;
beforeAll(async () => {
  browser = await launch();
});
afterAll(() => browser?.close());

async function faultsOf(path: string, colorScheme: 'light' | 'dark', width: number) {
  const page = await browser.newPage({ colorScheme, viewport: { width, height: 900 } });
  await page.goto(`${pathToFileURL(site).href}/${path}`, { waitUntil: 'load' });
  await page.evaluate(axe.source);
  const { violations } = await page.evaluate(() =>
    (globalThis as unknown as { axe: typeof axe }).axe.run({ resultTypes: ['violations'] }),
  );
  const overflow = await page.evaluate(
    () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
  );
  await page.close();
  const faults = violations.map(
    ({ id, nodes }) => `${id}: ${nodes.map(({ target }) => target.join(' ')).slice(0, 3)}`,
  );
  return overflow > 0 ? [...faults, `scrolls sideways by ${overflow} px`] : faults;
}

describe('axe finds nothing, and nothing scrolls sideways', { timeout: 60_000 }, () => {
  test.each(KINDS)('%s on a desktop', async (path) => {
    expect(await faultsOf(path, 'light', 1280)).toEqual([]);
  });

  test.each(KINDS)('%s on a phone, dark', async (path) => {
    expect(await faultsOf(path, 'dark', 360)).toEqual([]);
  });
});
