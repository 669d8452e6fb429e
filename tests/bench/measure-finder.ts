import type { Browser } from 'playwright-core';

const WORDS = ['olive', 'shea butter', 'castor', '"alkali into water"', 'lam', 'QY-00017'];
const REPEATS = 9;

/** Times from the last letter typed to the pages drawn, and from a changed range to the page drawn again. */
export async function measureFinder(
  browser: Browser,
  base: string,
  sizeOf: (path: string) => number,
): Promise<readonly string[]> {
  const page = await browser.newPage();
  let bytes = 0;
  let requests = 0;
  page.on('request', (request) => {
    const path = request.url().slice(base.length);
    if (!path.startsWith('search/') || path === 'search/finder.js') return;
    requests++;
    bytes += sizeOf(path);
  });
  await page.goto(`${base}find.html`);
  const lines: string[] = [];
  for (const [i, words] of WORDS.entries()) {
    const time = await page.evaluate(ask, words);
    const load = `${(bytes / 1000).toFixed(0)} kB in ${requests} requests`;
    const limit = i === 0 ? ' (at most 400 ms and 400 kB)' : '';
    lines.push(`words ${words}: ${time.toFixed(0)} ms, ${load}${limit}`);
    bytes = 0;
    requests = 0;
  }
  for (const words of WORDS.slice(0, 3)) {
    const time = await page.evaluate(ask, words);
    lines.push(`words ${words} again, loaded: ${time.toFixed(0)} ms (at most 60)`);
  }
  await page.evaluate(ask, '');
  const times = await page.evaluate(changeRange, REPEATS);
  const sorted = times.toSorted((a, b) => a - b);
  const median = sorted[sorted.length >> 1] ?? 0;
  lines.push(
    `range: ${median.toFixed(0)} ms in the middle, ${(sorted.at(-1) ?? 0).toFixed(0)} ms at most (at most 50)`,
  );
  await page.close();
  return lines;
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
  return performance.now() - start - pause;
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
