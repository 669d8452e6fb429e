import { pathToFileURL } from 'node:url';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, inject, test } from 'vitest';
import { sitePages } from '../support/site-files.ts';
import { launch } from './launch.ts';

const site = inject('site');
const pages = sitePages(site);
/** One page of each kind; what is printed before it is worked with is not tapped on. */
const KINDS = pages.filter((path, index) => {
  if (path === 'print.html') return false;
  const folder = path.split('/').slice(0, -1).join('/');
  return folder === '' || !pages.slice(0, index).some((other) => other.startsWith(`${folder}/`));
});

let browser: Browser;
let phone: Page;
beforeAll(async () => {
  browser = await launch();
  phone = await browser.newPage({ viewport: { width: 360, height: 740 }, hasTouch: true });
});
afterAll(() => browser?.close());
const open = (path: string) => phone.goto(`${pathToFileURL(site).href}/${path}`);

test('from the contents to the weights of a size in two taps', async () => {
  await open('index.html');
  await phone.locator('a[href="formulas/QY-014.html"]').tap();
  await phone.locator('.sizes a').nth(1).tap();
  const head = phone.locator('.batch-head').nth(1);
  await head.waitFor();
  const box = await head.boundingBox();
  expect(box?.y).toBeGreaterThanOrEqual(0);
  expect(box?.y).toBeLessThan(200);
  expect(await phone.locator('.batch').nth(1).locator('.weights .n').first().isVisible()).toBe(
    true,
  );
});

/** WCAG 2.2, 2.5.5 (AAA): 44 by 44 CSS pixels, but for links in a sentence or a row of a table. */
describe('what is tapped is large enough', () => {
  test.each(KINDS)('%s', async (path) => {
    await open(path);
    const small = await phone.evaluate(() => {
      const inSentence = (element: Element) => {
        const block = element.closest('p, li, td, th, dd, dt, label, summary, h3, h4');
        const own = (element.textContent ?? '').trim();
        return block !== null && (block.textContent ?? '').trim() !== own;
      };
      return [...document.querySelectorAll('a[href], button, input, select, summary')]
        .filter((element) => element.checkVisibility({ visibilityProperty: true }))
        .filter((element) => !element.closest('.skip, math') && !inSentence(element))
        .map((element) => ({ element, box: element.getBoundingClientRect() }))
        .filter(({ box }) => box.width > 0 && (box.width < 43.5 || box.height < 43.5))
        .map(
          ({ element, box }) =>
            `${element.tagName} ${element.className} ${(element.textContent ?? '').trim().slice(0, 24)} ${Math.round(box.width)}x${Math.round(box.height)}`,
        );
    });
    expect([...new Set(small)].slice(0, 6)).toEqual([]);
  });
});
