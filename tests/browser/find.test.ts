import { pathToFileURL } from 'node:url';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, inject, test } from 'vitest';
import type { FinderData } from '../../src/search/finder/finder-data.ts';
import { launch } from './launch.ts';
import { serve } from './serve.ts';

const site = inject('site');
let browser: Browser;
let server: Awaited<ReturnType<typeof serve>>;
const bases: Record<string, string> = {};

beforeAll(async () => {
  browser = await launch();
  server = await serve(site, '/shop/handbook/');
  bases['under a sub-path'] = server.origin;
  bases['opened as a file'] = `${pathToFileURL(site).href}/`;
});
afterAll(async () => {
  await browser?.close();
  await server?.close();
});

/** A page that fails the test at its first fault. */
async function open(where: string, hash = '', path = 'find.html'): Promise<Page> {
  const page = await browser.newPage({ serviceWorkers: 'block' });
  page.on('pageerror', (error) => {
    throw error;
  });
  await page.goto(`${bases[where]}${path}${hash}`);
  return page;
}

const count = async (page: Page) => (await page.locator('#find-count').textContent()) ?? '';
const number = async (page: Page) => Number((await count(page)).split(' ')[0]);
const counted = (page: Page, text: RegExp) =>
  page.waitForFunction(
    (source) => new RegExp(source).test(document.getElementById('find-count')?.textContent ?? ''),
    text.source,
  );
/** The address is written a moment after the last change. */
const hash = async (page: Page) => {
  await page.waitForTimeout(400);
  return page.evaluate(() => location.hash);
};

describe.each(['under a sub-path', 'opened as a file'])('the finder %s', (where) => {
  test('finds words, marks them, and leads to the page', async () => {
    const page = await open(where);
    await page.locator('#find-words').fill('castor');
    await page.locator('#find-pages-list li').first().waitFor();
    const titles = await page.locator('#find-pages-list li a').allInnerTexts();
    expect(titles).toContain('Castor oil');
    expect(await page.locator('#find-pages-list mark').first().textContent()).toMatch(/castor/i);
    await page.getByRole('link', { name: 'Castor oil', exact: true }).click();
    await page.waitForURL(/fats\/castor\.html$/);
    await page.close();
  });

  test('words and ranges narrow together, and the address brings them back', async () => {
    const page = await open(where);
    const all = await number(page);
    await page.locator('#find-words').fill('castor');
    await counted(page, new RegExp(`^(?!${all} )\\d+ of ${all}`));
    const words = await number(page);
    await page.getByLabel('Superfat, as written, at most').fill('5');
    await counted(page, new RegExp(`^(?!${words} )\\d+ of ${all}`));
    const both = await count(page);
    expect(await hash(page)).toBe('#words=castor&superfat=..5');
    const again = await open(where, await hash(page));
    await counted(again, new RegExp(`^${both}$`));
    expect(await again.locator('#find-words').inputValue()).toBe('castor');
    expect(await again.locator('#find-table tbody tr').count()).toBe(Number(both.split(' ')[0]));
    await page.close();
    await again.close();
  });

  test('pages of one type are listed, and limits on formulas leave the others alone', async () => {
    const page = await open(where, '#words=olive&where=methods&superfat=5..');
    await page.locator('#find-pages-list li').first().waitFor();
    const types = async () => {
      const links = await page.locator('#find-pages-list li a').all();
      const addresses = await Promise.all(links.map((link) => link.getAttribute('href')));
      return new Set(addresses.map((address) => /(\w+)(\/|\.html)/.exec(address ?? '')?.[1]));
    };
    expect(await types()).toContain('methods');
    expect(await types()).not.toContain('formulas');
    await page.getByLabel('Pages listed').selectOption('Formulas');
    await page.locator('#find-pages-list a[href*="formulas/"]').first().waitFor();
    expect([...(await types())]).toEqual(['formulas']);
    expect(await hash(page)).toBe('#words=olive&where=formulas&superfat=5..');
    await page.close();
  });

  test('the page of contents takes words to the finder', async () => {
    const page = await open(where, '', 'index.html');
    await page.getByLabel('Find by a word').fill('olive & "lye"#');
    await page.keyboard.press('Enter');
    await page.waitForURL(/find\.html#words=/);
    await page.locator('#find-form').waitFor();
    expect(await page.locator('#find-words').inputValue()).toBe('olive & "lye"#');
    await page.close();
  });

  test('by keyboard alone: words, a range, dropping it, sorting, to the formula', async () => {
    const page = await open(where);
    const focus = () =>
      page.evaluate(() => {
        const { activeElement } = document;
        return `${activeElement?.id} ${activeElement?.getAttribute('aria-label')} ${activeElement?.textContent}`;
      });
    const tabTo = async (wanted: RegExp) => {
      for (let i = 0; i < 120; i++) {
        await page.keyboard.press('Tab');
        if (wanted.test(await focus())) return;
      }
      throw new Error(`no way to ${wanted} by keyboard`);
    };
    await tabTo(/^find-words/);
    await page.keyboard.type('olive');
    await page.locator('#find-pages-list li').first().waitFor();
    await tabTo(/Superfat, as written, at least/);
    await page.keyboard.type('6');
    await page.keyboard.press('ArrowUp');
    expect(await hash(page)).toBe('#words=olive&superfat=6.1..');
    await tabTo(/Drop .*Superfat/);
    await page.keyboard.press('Enter');
    expect(await hash(page)).toBe('#words=olive');
    expect(await focus()).toMatch(/^find-count/);
    await tabTo(/Iodine value$/);
    await page.keyboard.press('Enter');
    expect(await hash(page)).toBe('#words=olive&sort=iodine-value');
    const values = await page.locator('#find-table tbody td:nth-child(5)').allInnerTexts();
    const numbers = values.filter((text) => /\d/.test(text)).map(Number);
    expect(numbers.length).toBeGreaterThan(5);
    expect(numbers).toEqual([...numbers].sort((a, b) => a - b));
    expect(await focus()).toMatch(/Iodine value$/);
    await page.keyboard.press('Tab');
    await page.keyboard.press('Tab');
    await page.keyboard.press('Enter');
    await page.waitForURL(/formulas\/.*\.html$/);
    await page.close();
  });
});

// how it answers is the same wherever it lies
describe('the finder', () => {
  const where = 'opened as a file';

  test('nothing left: says which limits to drop, and what each would leave', async () => {
    const page = await open(where, '#superfat=9..&iodine-value=..10&kind=paste');
    expect(await number(page)).toBe(0);
    expect(await page.locator('#find-limits').textContent()).toContain('No formula keeps all');
    const buttons = await page.locator('#find-limits button').allInnerTexts();
    expect(buttons).toHaveLength(3);
    for (const [i, text] of buttons.entries()) {
      const other = await open(where, await hash(page));
      await other.locator('#find-limits button').nth(i).click();
      expect(await number(other)).toBe(Number(/(\d+)$/.exec(text)?.[1]));
      await other.close();
    }
    await page.close();
  });

  test('drawing over a strip sets a range', async () => {
    const page = await open(where);
    const strip = page.locator('[data-property="superfat"] .strip svg');
    await strip.scrollIntoViewIfNeeded();
    const box = await strip.boundingBox();
    if (!box) throw new Error('no strip');
    await page.mouse.move(box.x + box.width * 0.2, box.y + 10);
    await page.mouse.down();
    await page.mouse.move(box.x + box.width * 0.5, box.y + 10, { steps: 5 });
    await page.mouse.up();
    expect(await hash(page)).toMatch(/^#superfat=\d+(\.\d)?\.\.\d+(\.\d)?$/);
    await page.close();
  });

  test.each([
    ['10,000 letters', 's'.repeat(10_000)],
    ['markup', '<img src=x onerror=alert(1)> "'],
    ['control characters', 'soap\u0007\u001b'],
    ['one letter', 's'],
    ['punctuation', '?!'],
  ])('%s is a query like any other', async (_, text) => {
    const page = await open(where);
    await page.locator('#find-words').fill(text);
    await page.waitForTimeout(400);
    expect(await count(page)).toMatch(/^\d+ of \d+/);
    expect(await page.locator('img').count()).toBe(0);
    expect(await page.locator('#find-broken').isVisible()).toBe(false);
    await page.close();
  });

  test('an address of nonsense says what was left out and asks for nothing', async () => {
    const page = await open(where, '#superfat=a..b&<b>=1&%zz&columns=none');
    expect(await page.locator('#find-ignored').textContent()).toContain('superfat=a..b · <b>=1');
    expect(await page.locator('#find-limits button').count()).toBe(0);
    await page.close();
  });

  test('a link to a part of the page is not a search', async () => {
    const page = await open(where, '#superfat=5');
    const before = await count(page);
    await page.evaluate(() => {
      location.hash = '#lists';
    });
    await page.waitForTimeout(100);
    expect(await count(page)).toBe(before);
    expect(await hash(page)).toBe('#superfat=5');
    await page.close();
  });
});

test('many rows: a screen at once, sixty soon, all when asked for; paper takes what is listed', async () => {
  const copies = 40;
  const page = await browser.newPage({ serviceWorkers: 'block' });
  await page.route('**/search/finder.js', async (route) => {
    const body = await (await route.fetch()).text();
    const data: FinderData = JSON.parse(body.replace(/^[^{]*/, '').replace(/;\s*$/, ''));
    const many = <T>(list: readonly T[]) => Array.from({ length: copies }, () => list).flat();
    const multiplied: FinderData = {
      codes: many(data.codes).map((_, i) => `QY-${i}`),
      names: many(data.names),
      properties: data.properties.map((each) => ({ ...each, values: many(each.values) })),
      traits: data.traits.map((each) => ({ ...each, members: many(each.members) })),
    };
    await route.fulfill({
      body: `self.handbookFinder=${JSON.stringify(multiplied)};`,
      contentType: 'text/javascript',
    });
  });
  await page.goto(`${bases['under a sub-path']}find.html`);
  const rows = page.locator('#find-table tbody tr');
  await rows.nth(59).waitFor();
  const all = await number(page);
  expect(all % copies).toBe(0);
  expect(await page.locator('#find-all').textContent()).toContain(`The first 60 of ${all} `);
  expect(await page.locator('#find-table table').getAttribute('aria-rowcount')).toBe(`${all + 1}`);
  const atOnce = await page.evaluate(() => {
    const drawn = () => document.querySelectorAll('#find-table tbody tr').length;
    const field = document.querySelector<HTMLInputElement>('[data-property="revision"] .end-min');
    if (field) field.value = '1';
    field?.dispatchEvent(new Event('input', { bubbles: true }));
    const first = drawn();
    dispatchEvent(new Event('beforeprint'));
    return { first, printed: drawn() };
  });
  expect(atOnce.first).toBeLessThan(60);
  expect(atOnce.printed).toBe(60);
  await page.getByRole('button', { name: 'Show 500 more' }).click();
  expect(await rows.count()).toBe(560);
  expect(await page.evaluate(() => document.activeElement?.closest('tr')?.rowIndex)).toBe(61);
  await page.getByRole('button', { name: `Show all ${all}` }).click();
  await rows.nth(all - 1).waitFor();
  const codes = await page.locator('#find-table tbody td.code').allInnerTexts();
  expect(codes).toEqual(Array.from({ length: all }, (_, i) => `QY-${i}`));
  expect(await page.locator('#find-all').textContent()).toBe('');
  await page.close();
});

describe('search files that are missing or damaged', () => {
  const withFault = async (files: string, answer: string | null) => {
    const page = await browser.newPage({ serviceWorkers: 'block' });
    await page.route(files, async (route) => {
      if (answer === null) await route.fulfill({ status: 404 });
      else await route.fulfill({ body: answer, contentType: 'text/javascript' });
    });
    await page.goto(`${bases['under a sub-path']}find.html`);
    return page;
  };

  test.each([
    ['an index file is missing', '**/search/index/*', null, /search\/index\/en_\w+\.pf_index\.js/],
    [
      'an index file is cut short',
      '**/search/index/*',
      'self.handbookIndex??={};\nhandbookIndex["index/en',
      /search\/index\/en_/,
    ],
    ['the entry is missing', '**/search/entry.*', null, /search\/entry\.en\.js/],
    [
      'the entry is not one',
      '**/search/entry.*',
      'self.handbookIndex={"entry.en":"{"}',
      /search\/entry/,
    ],
    ['a page text is missing', '**/search/fragment/*', null, /search\/fragment\/en_/],
  ])('%s: the page names it, ranges and lists stay', async (_, files, answer, named) => {
    const page = await withFault(files, answer);
    await page.locator('#find-words').fill('olive');
    await page.locator('#find-broken').waitFor();
    expect(await page.locator('#find-broken').textContent()).toMatch(named);
    await page.getByLabel('Superfat, as written, at least').fill('9');
    await counted(page, /^\d of /);
    expect(await page.locator('#lists a').first().isVisible()).toBe(true);
    await page.close();
  });

  test('the data of the finder is missing: the page names it, the lists stay', async () => {
    const page = await withFault('**/search/finder.js', null);
    expect(await page.locator('#find-broken').textContent()).toContain('search/finder.js');
    expect(await page.locator('#find-form').isVisible()).toBe(false);
    expect(await page.locator('#lists a').first().isVisible()).toBe(true);
    await page.close();
  });
});

test('without scripts the lists answer', async () => {
  const context = await browser.newContext({ javaScriptEnabled: false });
  const page = await context.newPage();
  await page.goto(`${bases['opened as a file']}index.html`);
  expect(await page.locator('#contents-find').isVisible()).toBe(false);
  await page.locator('#contents-find-link').click();
  expect(await page.locator('#find-off').isVisible()).toBe(true);
  expect(await page.locator('#find-form').isVisible()).toBe(false);
  await page.getByRole('link', { name: 'Formulas by fat' }).click();
  expect(await page.getByRole('heading', { name: 'Olive oil' }).count()).toBe(1);
  await context.close();
});
