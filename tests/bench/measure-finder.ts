import type { Page } from 'playwright-core';
import { launch } from '../browser/launch.ts';

const WORDS = ['olive', 'shea butter', 'castor', '"alkali into water"', 'lam'];
const REPEATS = 9;

/** Times of one visit. [ms] */
export interface FinderTimes {
  /** From the last letter typed to the pages drawn: words for which files must be loaded, the first from cold. */
  readonly loading: readonly { readonly words: string; readonly ms: number; readonly load: Load }[];
  /** The same words again. */
  readonly loaded: readonly { readonly words: string; readonly ms: number }[];
  /** From a changed range to the page laid out again, all strips open. */
  readonly ranges: readonly number[];
}

/** What was loaded for an answer. */
export interface Load {
  readonly bytes: number;
  readonly requests: number;
}

/** Visits the find page below `base` in a browser of its own, so that nothing is warm. */
export async function measureFinder(
  base: string,
  sizeOf: (path: string) => number,
  code: string,
): Promise<FinderTimes> {
  const browser = await launch();
  try {
    const page = await browser.newPage();
    const loads = countLoads(page, base, sizeOf);
    await page.goto(`${base}find.html`);
    const loading: FinderTimes['loading'][number][] = [];
    for (const words of [...WORDS, code]) {
      const ms = await page.evaluate(ask, words);
      loading.push({ words, ms, load: loads() });
    }
    const loaded: FinderTimes['loaded'][number][] = [];
    for (const words of WORDS) loaded.push({ words, ms: await page.evaluate(ask, words) });
    await page.evaluate(ask, '');
    return { loading, loaded, ranges: await page.evaluate(changeRange, REPEATS) };
  } finally {
    await browser.close();
  }
}

/** Counts what the search loads; each call gives what came since the last. */
function countLoads(page: Page, base: string, sizeOf: (path: string) => number): () => Load {
  let load: Load = { bytes: 0, requests: 0 };
  page.on('request', (request) => {
    const path = request.url().slice(base.length);
    if (!path.startsWith('search/') || path === 'search/finder.js') return;
    load = { bytes: load.bytes + sizeOf(path), requests: load.requests + 1 };
  });
  return () => {
    const since = load;
    load = { bytes: 0, requests: 0 };
    return since;
  };
}

/** In the page: types words; gives the time until the pages stand there, less the pause after typing. [ms] */
async function ask(words: string): Promise<number> {
  const pause = 120;
  const field = document.getElementById('find-words') as HTMLInputElement;
  const list = document.getElementById('find-pages-list') as HTMLElement;
  const section = document.getElementById('find-pages') as HTMLElement;
  list.replaceChildren();
  const start = performance.now();
  field.value = words;
  field.dispatchEvent(new Event('input', { bubbles: true }));
  const drawn = () =>
    words === '' ? section.hidden : list.querySelector('ol')?.dataset.words === words;
  while (!drawn()) await new Promise((resolve) => setTimeout(resolve, 1));
  await new Promise((resolve) => requestAnimationFrame(resolve));
  const time = performance.now() - start - pause;
  // a reader looks at an answer before asking again
  await new Promise((resolve) => setTimeout(resolve, 600));
  return time;
}

/** In the page: changes a range again and again; gives the times until each is laid out. [ms] */
async function changeRange(repeats: number): Promise<readonly number[]> {
  for (const details of document.querySelectorAll('details')) details.open = true;
  await new Promise((resolve) => setTimeout(resolve, 500));
  const field = document.querySelector<HTMLInputElement>('[data-property="superfat"] .end-min');
  if (!field) throw new Error('no range to change');
  const times: number[] = [];
  for (let i = 0; i < repeats; i++) {
    const start = performance.now();
    field.value = String(3 + i / 4);
    field.dispatchEvent(new Event('input', { bubbles: true }));
    document.body.getBoundingClientRect();
    times.push(performance.now() - start);
    await new Promise((resolve) => setTimeout(resolve, 30));
  }
  return times;
}
