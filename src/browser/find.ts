import { readAddress, writeAddress } from '../search/finder/address.ts';
import { answer, inOrder } from '../search/finder/answer.ts';
import type { FinderData } from '../search/finder/finder-data.ts';
import { type Limit, limitsOf } from '../search/finder/limits.ts';
import { type FinderState, NOTHING_ASKED } from '../search/finder/state.ts';
import { LONGEST_QUERY } from '../search/reader/query.ts';
import { findWords } from '../words/en/find.ts';
import { ChunkError } from './find-chunks.ts';
import { element, part } from './find-dom.ts';
import { fillFields, readFields } from './find-fields.ts';
import { more, pageList } from './find-pages.ts';
import { strips } from './find-strips.ts';
import { FIRST_ROWS, resultTable } from './find-table.ts';
import { limitText } from './find-text.ts';
import { type WordsFound, wordSearch } from './find-words.ts';

declare global {
  /** Set by the finder's data script. */
  var handbookFinder: FinderData | undefined;
}

const DEFAULT_COLUMNS = ['superfat', 'lowest-superfat', 'iodine-value', 'lye-concentration'];
/** Between the last letter typed and the search. [ms] */
const PAUSE = 120;

if (globalThis.handbookFinder) start(globalThis.handbookFinder);
else say('find-broken', findWords.searchBroken('search/finder.js'));

function start(data: FinderData): void {
  const form = part('find-form');
  const look = wordSearch(document.documentElement.lang);
  let { state, ignored } = readAddress(location.hash, data);
  let found: WordsFound | null = null;
  let allRows = false;
  let pagesShown: number | undefined;
  let asked = 0;
  let pause: ReturnType<typeof setTimeout> | undefined;

  const draw = strips(data, form, (change) => become(change(state)));

  function become(next: FinderState): void {
    const words = next.words !== state.words;
    state = next;
    allRows = false;
    const address = writeAddress(state, data);
    history.replaceState(null, '', address === '' ? location.pathname : `#${address}`);
    render();
    if (!words) return;
    clearTimeout(pause);
    pause = setTimeout(findWordsNow, PAUSE);
  }

  async function findWordsNow(): Promise<void> {
    const turn = ++asked;
    pagesShown = undefined;
    let note = state.words.length > LONGEST_QUERY ? findWords.wordsCut(LONGEST_QUERY) : '';
    try {
      const answered = state.words.trim() === '' ? null : await look(state.words);
      if (turn !== asked) return;
      found = answered;
      if (!found && state.words.trim() !== '') note = findWords.noWord;
    } catch (error) {
      if (turn !== asked) return;
      found = null;
      broken(error);
    }
    say('find-words-note', note);
    render();
  }

  function render(): void {
    const columns = shownColumns(data, state);
    fillFields(
      form,
      data,
      state,
      columns.map(({ id }) => id),
    );
    const limits = limitsOf(state, data, found && new Set(found.rows));
    const { rows, withoutLimit } = answer(data, limits);
    draw(state, rows);
    part('find-count').textContent = findWords.found(rows.length, data.codes.length);
    part('find-limits').replaceChildren(...limitList(limits, rows.length, withoutLimit));
    const ordered = inOrder(rows, data, state.sort, found?.rows ?? null);
    const shown = allRows ? ordered : ordered.slice(0, FIRST_ROWS);
    const table = part('find-table');
    const focused = document.activeElement?.getAttribute('data-sort');
    table.replaceChildren(...(rows.length > 0 ? [resultTable(data, state, shown, columns)] : []));
    if (focused) table.querySelector<HTMLElement>(`[data-sort="${focused}"]`)?.focus();
    part('find-all').replaceChildren(
      ...(shown.length < ordered.length
        ? [element('button', { type: 'button' }, findWords.showAll(ordered.length))]
        : []),
    );
    renderPages(limits, new Set(rows)).catch(broken);
  }

  async function renderPages(limits: readonly Limit[], rows: ReadonlySet<number>): Promise<void> {
    const section = part('find-pages');
    section.hidden = !found;
    if (!found) return;
    const { search, hits, rowOf } = found;
    const narrowed = limits.length > 1;
    const kept = narrowed ? hits.filter(({ page }) => rows.has(rowOf.get(page) ?? -1)) : hits;
    const turn = asked;
    const { list, left } = await pageList(search, kept, pagesShown);
    if (turn !== asked) return;
    const note = kept.length === 0 ? findWords.noPages : narrowed ? findWords.outsideLimits : '';
    part('find-pages-list').replaceChildren(
      ...(note === '' ? [] : [element('p', { class: 'label' }, note)]),
      list,
      ...(left > 0 ? [element('button', { type: 'button' }, findWords.morePages(left))] : []),
    );
  }

  function limitList(limits: readonly Limit[], rows: number, without: readonly number[]) {
    const items = limits.map(({ about }, i) =>
      element(
        'li',
        {},
        element(
          'button',
          { type: 'button', 'data-limit': `${i}` },
          findWords.drop(limitText(about), without[i] ?? 0),
        ),
      ),
    );
    const lead = rows === 0 ? findWords.nothing : `${findWords.inForce}:`;
    dropped = limits.map((limit) => limit.dropped);
    return items.length === 0 ? [] : [element('p', {}, lead), element('ul', {}, ...items)];
  }
  let dropped: readonly FinderState[] = [];

  form.addEventListener('submit', (event) => event.preventDefault());
  form.addEventListener('input', (event) => {
    const field = event.target as HTMLInputElement;
    if (field.dataset.column) become({ ...state, columns: pickedColumns(data, state, field) });
    else become(readFields(form, data, state));
  });
  form.addEventListener('toggle', () => render(), true);
  part('find-clear').addEventListener('click', () =>
    become({ ...NOTHING_ASKED, columns: state.columns }),
  );
  part('find-limits').addEventListener('click', ({ target }) => {
    const place = (target as HTMLElement).closest('button')?.dataset.limit;
    const next = place === undefined ? undefined : dropped[Number(place)];
    if (!next) return;
    become(next);
    // the button is gone; the keyboard goes on from the count
    part('find-count').focus();
  });
  part('find-table').addEventListener('click', ({ target }) => {
    const by = (target as HTMLElement).closest('button')?.dataset.sort;
    if (by === undefined) return;
    const same = state.sort?.by === by;
    become({ ...state, sort: same && state.sort?.descending ? null : { by, descending: same } });
  });
  part('find-all').addEventListener('click', () => {
    allRows = true;
    render();
  });
  part('find-pages-list').addEventListener('click', ({ target }) => {
    if (!(target as HTMLElement).closest('button')) return;
    pagesShown = more(pagesShown ?? 10);
    render();
  });
  addEventListener('hashchange', () => {
    ({ state, ignored } = readAddress(location.hash, data));
    say('find-ignored', ignored.length > 0 ? findWords.ignored(ignored.join(' · ')) : '');
    render();
    findWordsNow();
  });

  for (const id of ['find-form', 'find-results']) part(id).hidden = false;
  part('find-off').hidden = true;
  say('find-ignored', ignored.length > 0 ? findWords.ignored(ignored.join(' · ')) : '');
  render();
  if (state.words !== '') findWordsNow();
}

/** The chosen columns, or the usual ones and those that a range is set for. */
function shownColumns(data: FinderData, { columns, ranges }: FinderState) {
  const usual = (id: string) => DEFAULT_COLUMNS.includes(id) || ranges[id] !== undefined;
  return data.properties.filter(({ id }) => (columns ? columns.includes(id) : usual(id)));
}

function pickedColumns(data: FinderData, state: FinderState, field: HTMLInputElement) {
  const before = shownColumns(data, state).map(({ id }) => id);
  const id = field.dataset.column ?? '';
  return field.checked ? [...before, id] : before.filter((each) => each !== id);
}

function broken(error: unknown): void {
  if (!(error instanceof ChunkError)) throw error;
  say('find-broken', findWords.searchBroken(error.message));
}

function say(id: string, text: string): void {
  const place = part(id);
  place.textContent = text;
  place.hidden = text === '';
}
