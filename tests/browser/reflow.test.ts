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

/** Distances that a reader may set (WCAG 2.2, 1.4.12). */
const SPACED = `* {
  line-height: 1.5 !important;
  letter-spacing: 0.12em !important;
  word-spacing: 0.16em !important;
}
p { margin-bottom: 2em !important; }`;

/** What moves by itself, though the reader has asked for less motion. */
const moving = (page: Page) =>
  page.evaluate(() =>
    [...document.querySelectorAll('*')]
      .filter((element) => {
        const { transitionDuration, animationName, scrollBehavior } = getComputedStyle(element);
        const still = /^(0s(, )?)+$/.test(transitionDuration) && animationName === 'none';
        return !still || scrollBehavior === 'smooth';
      })
      .map((element) => `${element.outerHTML.slice(0, 90)} moves`),
  );

/** How far the page scrolls sideways, and text that its own box cuts off. */
const lost = (page: Page) =>
  page.evaluate(() => {
    const root = document.documentElement;
    const faults: string[] = [];
    const over = root.scrollWidth - root.clientWidth;
    if (over > 0) faults.push(`scrolls sideways by ${over} px`);
    for (const element of document.querySelectorAll<HTMLElement>('main *, header *, footer *')) {
      if (element.scrollHeight <= element.clientHeight + 1) {
        if (element.scrollWidth <= element.clientWidth + 1) continue;
      }
      const { overflowX, overflowY, clipPath, display } = getComputedStyle(element);
      // what is only heard is cut on purpose; a field scrolls its text
      if (clipPath !== 'none' || display === 'inline' || element.matches('input, select')) continue;
      const cutsWidth = ['hidden', 'clip'].includes(overflowX);
      const cutsHeight = ['hidden', 'clip'].includes(overflowY);
      if (cutsWidth || cutsHeight) faults.push(`cuts ${element.outerHTML.slice(0, 90)}`);
    }
    return faults;
  });

describe('a page that is enlarged or spaced', { timeout: 60_000 }, () => {
  test.each(PAGES_OF_KINDS)('%s loses nothing', async (path) => {
    const page = await browser.newPage({
      viewport: { width: 640, height: 512 },
      reducedMotion: 'reduce',
    });
    await page.goto(`${pathToFileURL(site).href}/${path}`, { waitUntil: 'load' });
    await shorten(page);
    const faults: Record<string, readonly string[]> = {};
    // a window of 1280 px at twice and four times the size (WCAG 2.2, 1.4.4 and 1.4.10)
    faults['200 %'] = await lost(page);
    faults['less motion'] = await moving(page);
    await page.setViewportSize({ width: 320, height: 256 });
    faults['400 %'] = await lost(page);
    await page.evaluate((css) => {
      const sheet = new CSSStyleSheet();
      sheet.replaceSync(css);
      document.adoptedStyleSheets = [sheet];
    }, SPACED);
    await page.setViewportSize({ width: 1280, height: 900 });
    faults.spaced = await lost(page);
    await page.setViewportSize({ width: 640, height: 512 });
    faults['spaced at 200 %'] = await lost(page);
    await page.close();
    const found = Object.entries(faults).filter(([, each]) => each.length > 0);
    expect(Object.fromEntries(found)).toEqual({});
  });
});
