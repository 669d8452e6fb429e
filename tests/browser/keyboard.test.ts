import { pathToFileURL } from 'node:url';
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

/** What a page takes the focus with, in the order of its text; a long list is walked at both ends. */
const ENDS = 25;
const TAKES_FOCUS =
  'a[href], button, input, select, textarea, summary, [tabindex]:not([tabindex="-1"])';

declare global {
  interface Window {
    /** What took the focus, by its place among all that can. */
    walked: { place: number; faults: string[] }[];
    stops: Element[];
  }
}

/** Notes of everything that takes the focus where it stands in the page and what is wrong with how that shows. */
const watch = (page: Page) =>
  page.evaluate((selector) => {
    const isShown = (element: Element) =>
      element.checkVisibility({ visibilityProperty: true }) && !element.matches(':disabled');
    window.stops = [...document.querySelectorAll(selector)].filter(isShown);
    window.walked = [];
    document.addEventListener('focusin', ({ target }) => {
      const element = target as HTMLElement;
      const style = getComputedStyle(element);
      const faults: string[] = [];
      if (style.outlineStyle === 'none' || Number.parseFloat(style.outlineWidth) < 2) {
        faults.push('shows no focus');
      }
      const { left, top, width, height } = element.getBoundingClientRect();
      if (left + width <= 0 || left >= innerWidth || top + height <= 0 || top >= innerHeight) {
        faults.push('is out of sight');
      }
      window.walked.push({
        place: window.stops.indexOf(element),
        faults: faults.map((fault) => `${element.outerHTML.slice(0, 90)} ${fault}`),
      });
    });
  }, TAKES_FOCUS);

/** Presses Tab that often and gives what took the focus. */
async function walk(page: Page, steps: number) {
  await page.evaluate(() => {
    window.walked = [];
  });
  for (let i = 0; i < steps; i++) await page.keyboard.press('Tab');
  return page.evaluate(() => window.walked);
}

const placesFrom = (first: number, count: number) =>
  Array.from({ length: count }, (_, i) => first + i);

/** Whether the first stop leads to the content: the next one then lies behind the menu. */
async function skipsTheMenu(page: Page): Promise<boolean> {
  await page.reload({ waitUntil: 'load' });
  await page.keyboard.press('Tab');
  const first = await page.locator(':focus').getAttribute('href');
  await page.keyboard.press('Enter');
  await page.keyboard.press('Tab');
  const inMenu = await page.evaluate(
    () => document.activeElement?.closest('.running-head') !== null,
  );
  return first === '#content' && !inMenu;
}

describe('by Tab alone', { timeout: 60_000 }, () => {
  test.each(PAGES_OF_KINDS)('%s is walked in the order of its text', async (path) => {
    const page = await browser.newPage({ viewport: { width: 1280, height: 900 } });
    await page.goto(`${pathToFileURL(site).href}/${path}`, { waitUntil: 'load' });
    await shorten(page);
    await watch(page);
    const stops = await page.evaluate(() => window.stops.length);
    const atStart = Math.min(stops, ENDS);
    const start = await walk(page, atStart);
    expect(start.map(({ place }) => place)).toEqual(placesFrom(0, atStart));
    const atEnd = Math.min(stops - atStart, ENDS);
    if (atEnd > 0) {
      await page.evaluate(
        (place) => (window.stops[place] as HTMLElement).focus(),
        stops - atEnd - 1,
      );
    }
    const end = await walk(page, atEnd);
    expect(end.map(({ place }) => place)).toEqual(placesFrom(stops - atEnd, atEnd));
    expect([...start, ...end].flatMap(({ faults }) => faults)).toEqual([]);
    // the last stop lets go: nothing holds the focus for good
    await page.keyboard.press('Tab');
    const last = await page.evaluate(() => window.stops.indexOf(document.activeElement as Element));
    expect(stops === 0 || last < stops - 1).toBe(true);
    if (await page.locator('.skip').count()) expect(await skipsTheMenu(page)).toBe(true);
    await page.close();
  });
});
