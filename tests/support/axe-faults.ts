import { pathToFileURL } from 'node:url';
import axe from 'axe-core';
import type { Browser } from 'playwright-core';

/**
 * One page of each kind: the first of every folder, and every page that stands alone. The document to print is made
 * of such pages and too long for axe.
 */
export const onePageOfEachKind = (pages: readonly string[]): readonly string[] =>
  pages.filter((path, index) => {
    if (path === 'print.html') return false;
    const folder = path.split('/').slice(0, -1).join('/');
    return folder === '' || !pages.slice(0, index).some((other) => other.startsWith(`${folder}/`));
  });

/**
 * What axe finds on a page of a built site, and whether it scrolls sideways. Contrasts take most of its time and can
 * be left out where another test looks at the same colours.
 */
export async function faultsOf(
  browser: Browser,
  site: string,
  path: string,
  colorScheme: 'light' | 'dark',
  width: number,
  { colours = true }: { readonly colours?: boolean } = {},
): Promise<readonly string[]> {
  const page = await browser.newPage({ colorScheme, viewport: { width, height: 900 } });
  await page.goto(`${pathToFileURL(site).href}/${path}`, { waitUntil: 'load' });
  await page.evaluate(axe.source);
  const { violations } = await page.evaluate(
    (enabled) =>
      (globalThis as unknown as { axe: typeof axe }).axe.run({
        resultTypes: ['violations'],
        rules: { 'color-contrast': { enabled } },
      }),
    colours,
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
