import { existsSync } from 'node:fs';
import { join } from 'node:path';
import { pathToFileURL } from 'node:url';
import axe from 'axe-core';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, inject, test } from 'vitest';
import { PAGES_OF_KINDS } from '../support/page-kinds.ts';
import { launch } from './launch.ts';
import { shorten } from './shorten.ts';

const site = inject('site');
let browser: Browser;
beforeAll(async () => {
  browser = await launch();
});
afterAll(() => browser?.close());

/** What can be right in one mode and wrong in the next, as a mode hides parts and lets others scroll. */
const STRUCTURE = ['heading-order', 'empty-heading', 'empty-table-header'];
const LAYOUT = ['scrollable-region-focusable', ...STRUCTURE];

const DESKTOP = { width: 1280, height: 900 };
const PHONE = { width: 360, height: 780 };
const LIGHT = { media: 'screen', colorScheme: 'light', forcedColors: 'none' } as const;
const DARK = { ...LIGHT, colorScheme: 'dark' } as const;
const FORCED = { ...LIGHT, forcedColors: 'active' } as const;
const PRINT = { ...LIGHT, media: 'print' } as const;

/**
 * All rules where the page is first seen; then, in place, those that a mode can break. Contrast takes longest and is
 * looked at once a theme; in forced colours it is the reader's own choice.
 */
const MODES = [
  { mode: 'light, desktop', size: DESKTOP, media: LIGHT, rules: null },
  { mode: 'forced colours, desktop', size: DESKTOP, media: FORCED, rules: LAYOUT },
  { mode: 'print', size: DESKTOP, media: PRINT, rules: ['color-contrast', ...STRUCTURE] },
  { mode: 'light, phone', size: PHONE, media: LIGHT, rules: LAYOUT },
  { mode: 'dark, phone', size: PHONE, media: DARK, rules: ['color-contrast'] },
  { mode: 'forced colours, phone', size: PHONE, media: FORCED, rules: LAYOUT },
] as const;

async function faultsOf(page: Page, rules: readonly string[] | null) {
  const violations = await page.evaluate(async (only) => {
    const { axe: inPage } = globalThis as unknown as { axe: typeof axe };
    const result = await inPage.run({
      resultTypes: ['violations'],
      ...(only && { runOnly: { type: 'rule', values: [...only] } }),
    });
    return result.violations.map(({ id, nodes }) => [
      id,
      ...nodes.slice(0, 3).map(({ target }) => target.join(' ')),
    ]);
  }, rules);
  return violations.map((violation) => violation.join(' | '));
}

describe('axe finds nothing', { timeout: 90_000 }, () => {
  test.each(PAGES_OF_KINDS)('%s, in every mode', async (path) => {
    expect(existsSync(join(site, path))).toBe(true);
    const page = await browser.newPage({ viewport: DESKTOP });
    await page.goto(`${pathToFileURL(site).href}/${path}`, { waitUntil: 'load' });
    await shorten(page);
    await page.evaluate(axe.source);
    const faults: Record<string, readonly string[]> = {};
    for (const { mode, size, media, rules } of MODES) {
      await page.setViewportSize(size);
      await page.emulateMedia(media);
      const found = await faultsOf(page, rules);
      if (found.length > 0) faults[mode] = found;
    }
    await page.close();
    expect(faults).toEqual({});
  });
});

test('in forced colours one entry of the menu is marked, and drawings have the colours of the text', async () => {
  const page = await browser.newPage({ forcedColors: 'active' });
  await page.goto(`${pathToFileURL(site).href}/formulas/QY-018.html`);
  const seen = await page.evaluate(() => {
    const colour = (element: Element | null, property: string) =>
      element && getComputedStyle(element).getPropertyValue(property);
    const ground = colour(document.documentElement, 'background-color');
    const entries = [...document.querySelectorAll('.running-head nav a')];
    const marked = entries.filter((entry) => colour(entry, 'border-bottom-color') !== ground);
    return {
      marked: marked.map((entry) => entry.hasAttribute('aria-current')),
      drawn: colour(document.querySelector('.bar .solid'), 'fill'),
      written: colour(document.body, 'color'),
    };
  });
  await page.close();
  expect(seen.marked).toEqual([true]);
  expect(seen.drawn).toBe(seen.written);
});
