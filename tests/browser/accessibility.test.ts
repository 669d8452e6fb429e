import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, inject, test } from 'vitest';
import { faultsOf, onePageOfEachKind } from '../support/axe-faults.ts';
import { sitePages } from '../support/site-files.ts';
import { launch } from './launch.ts';

const site = inject('site');
const pages = sitePages(site);

const KINDS = onePageOfEachKind(pages);

let browser: Browser;
beforeAll(async () => {
  browser = await launch();
});
afterAll(() => browser?.close());

describe('axe finds nothing, and nothing scrolls sideways', { timeout: 60_000 }, () => {
  test.each(KINDS)('%s on a desktop', async (path) => {
    expect(await faultsOf(browser, site, path, 'light', 1280)).toEqual([]);
  });

  test.each(KINDS)('%s on a phone, dark', async (path) => {
    expect(await faultsOf(browser, site, path, 'dark', 360)).toEqual([]);
  });
});
