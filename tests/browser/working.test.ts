import { pathToFileURL } from 'node:url';
import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, expect, inject, test } from 'vitest';
import { sitePages } from '../support/site-files.ts';
import { launch } from './launch.ts';

const site = inject('site');
const pages = sitePages(site).filter((path) => path.startsWith('working/'));
let browser: Browser;
beforeAll(async () => {
  browser = await launch();
});
afterAll(() => browser?.close());

interface Line {
  readonly id: string;
  readonly numbers: string;
  readonly result: string;
}

/**
 * Runs in the page: every displayed equation as what a reader would key in, and the result beside it. Only
 * what is printed is read.
 */
function readEquations(): Line[] {
  const keyed = (element: Element): string => {
    const parts = [...element.children];
    switch (element.localName) {
      case 'mn':
        return element.textContent ?? '';
      case 'mo':
        return { '·': '*', '−': '-' }[element.textContent ?? ''] ?? element.textContent ?? '';
      case 'mfrac':
        return `((${keyed(parts[0] as Element)})/(${keyed(parts[1] as Element)}))`;
      case 'msqrt':
        return `Math.sqrt(${parts.map(keyed).join('')})`;
      case 'msup':
        return `((${keyed(parts[0] as Element)})**2)`;
      case 'mrow':
        return parts.map(keyed).join('');
      default:
        return '?';
    }
  };
  return [...document.querySelectorAll('.working > div')].flatMap((line) => {
    const sides: Element[][] = [[]];
    for (const part of line.querySelector('math > mrow')?.children ?? []) {
      if (part.localName === 'mo' && part.textContent === '=') sides.push([]);
      else sides.at(-1)?.push(part);
    }
    const result = sides.at(-1)?.[0];
    const numbers = sides.at(-2) ?? [];
    if (!result || sides.length < 3) return [];
    // the result and its unit stand in one row
    const value = [...result.children].filter((child) => child.localName !== 'mi');
    return [
      { id: line.id, numbers: numbers.map(keyed).join(''), result: value.map(keyed).join('') },
    ];
  });
}

test('a pocket calculator comes to every result that a working page prints', {
  timeout: 120_000,
}, async () => {
  const page = await browser.newPage();
  let lines = 0;
  const wrong: string[] = [];
  for (const path of pages) {
    await page.goto(`${pathToFileURL(site).href}/${path}`);
    for (const { id, numbers, result } of await page.evaluate(readEquations)) {
      lines += 1;
      expect(numbers, `${path} ${id}`).toMatch(/^[\d.+\-*/()]*(Math\.sqrt|[\d.+\-*/()])*$/);
      const found = Number(new Function(`return ${numbers}`)());
      const printed = Number(result);
      const unit = 10 ** -(result.split('.')[1]?.length ?? 0);
      // the last digit or one off, and what five or six digits of a small difference can lose
      const allowed = Math.max(
        1.5 * unit,
        1e-4 * Math.abs(printed),
        id.includes('expanded') ? 0.003 : 0,
      );
      if (!(Math.abs(found - printed) <= allowed))
        wrong.push(`${path} ${id}: ${numbers} = ${found}, not ${printed}`);
    }
  }
  await page.close();
  expect(pages.length).toBeGreaterThanOrEqual(30);
  expect(lines).toBeGreaterThan(1500);
  expect(wrong).toEqual([]);
});
