import { pathToFileURL } from 'node:url';
import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, inject, test } from 'vitest';
import { PAGES_OF_KINDS } from '../support/page-kinds.ts';
import { sitePages } from '../support/site-files.ts';
import { launch } from './launch.ts';
import { serve } from './serve.ts';

const site = inject('site');
const pages = sitePages(site);
let browser: Browser;
let servers: Awaited<ReturnType<typeof serve>>[] = [];
const bases: Record<string, string> = {};

beforeAll(async () => {
  browser = await launch();
  servers = [await serve(site, '/'), await serve(site, '/shop/handbook/')];
  bases['at the root of a host'] = servers[0]?.origin ?? '';
  bases['under a sub-path'] = servers[1]?.origin ?? '';
  bases['opened as a file'] = `${pathToFileURL(site).href}/`;
});
afterAll(async () => {
  await browser?.close();
  await Promise.all(servers.map(({ close }) => close()));
});

// the same bytes everywhere, and every link is followed elsewhere: all pages in one place, each kind in the others
const WALKS: readonly (readonly [where: string, which: string, paths: readonly string[]])[] = [
  ['at the root of a host', 'every kind of page', PAGES_OF_KINDS],
  ['under a sub-path', 'every kind of page', PAGES_OF_KINDS],
  ['opened as a file', 'every page', pages],
];

describe.each(WALKS)('%s', (where, which, paths) => {
  test(`${which} loads whole, in silence, and asks no other host`, {
    timeout: 240_000,
  }, async () => {
    const base = bases[where] ?? '';
    // a copy on the device would answer for the site
    const page = await browser.newPage({ serviceWorkers: 'block' });
    const wrong: string[] = [];
    let current = '';
    page.on('console', (message) => {
      const isOurs = !message.text().includes('registration blocked by Playwright');
      if (isOurs && ['error', 'warning'].includes(message.type()))
        wrong.push(`${current}: ${message.text()}`);
    });
    page.on('pageerror', (error) => wrong.push(`${current}: ${error.message}`));
    page.on('requestfailed', (request) => {
      const reason = request.failure()?.errorText ?? '';
      // leaving a page while its icon still loads aborts the icon; a missing file has another reason
      if (!reason.includes('ERR_ABORTED')) wrong.push(`${current}: ${reason} ${request.url()}`);
    });
    page.on('request', (request) => {
      if (!request.url().startsWith(base)) wrong.push(`${current}: asked for ${request.url()}`);
    });
    page.on('response', (response) => {
      if (response.status() >= 400)
        wrong.push(`${current}: ${response.status()} ${response.url()}`);
    });
    for (const path of paths) {
      current = path;
      await page.goto(base + path, { waitUntil: 'load' });
      expect(await page.locator('h1').count(), `${path} has one first heading`).toBe(1);
    }
    await page.close();
    expect(paths.length).toBeGreaterThan(25);
    expect(wrong).toEqual([]);
  });
});
