import './speak.ts';
import { readAddress, writeAddress } from '../search/finder/address.ts';
import type { FinderData } from '../search/finder/finder-data.ts';
import { type FinderState, NOTHING_ASKED } from '../search/finder/state.ts';
import { LONGEST_QUERY } from '../search/reader/query.ts';
import { findWords } from '../words/en/find.ts';
import { canSearch } from './find-chunks.ts';
import { shownColumns, withColumn } from './find-columns.ts';
import { part } from './find-dom.ts';
import { fieldsOf, fillFields, readFields } from './find-fields.ts';
import { FIRST_ROWS, focusRow, MORE_ROWS } from './find-list.ts';
import { say, sayBroken } from './find-notes.ts';
import { drawResults, type Results, type Shown } from './find-results.ts';
import { strips } from './find-strips.ts';
import { type WordsFound, wordSearch } from './find-words.ts';

declare global {
  /** Set by the finder's data script. */
  var handbookFinder: FinderData | undefined;
}

/** Between the last letter typed and the search. [ms] */
const PAUSE = 120;
/** Between the last change and the address, which is written when the page has been drawn. [ms] */
const ADDRESS_PAUSE = 250;
const FIRST: Shown = { rows: FIRST_ROWS, pages: 5 };
const MORE_PAGES = 20;

if (globalThis.handbookFinder) start(globalThis.handbookFinder);
else say('find-broken', findWords.searchBroken('search/finder.js'));

function start(data: FinderData): void {
  const form = part('find-form');
  const fields = fieldsOf(form, data);
  const words = wordSearch(document.documentElement.lang);
  const drawStrips = strips(data, form, (change) => become(change(state)));
  let state: FinderState = NOTHING_ASKED;
  let shown = FIRST;
  let found: WordsFound | null = null;
  let results: Results = { rows: [], dropped: [] };
  let turn = 0;
  let pause: ReturnType<typeof setTimeout> | undefined;
  let writing: ReturnType<typeof setTimeout> | undefined;

  function become(next: FinderState): void {
    const wordsChanged = next.words !== state.words;
    state = next;
    shown = FIRST;
    keepAddress();
    if (wordsChanged) {
      clearTimeout(pause);
      // a search that has not ended yet is for other words
      turn++;
      if (state.words.trim() !== '') {
        words.open();
        pause = setTimeout(lookForWords, PAUSE);
        return;
      }
      found = null;
      say('find-words-note', '');
    }
    draw();
  }

  function draw(): void {
    const columns = shownColumns(data, state);
    fillFields(fields, state, new Set(columns.map(({ id }) => id)));
    results = drawResults(data, state, found, shown);
    drawStrips(state, results.rows);
  }

  async function lookForWords(): Promise<void> {
    if (!canSearch()) {
      say('find-words-note', findWords.browserTooOld);
      draw();
      return;
    }
    const mine = ++turn;
    const asked = state.words;
    try {
      const answered = await words.find(asked);
      if (mine !== turn) return;
      found = answered;
      say('find-broken', '');
      const tooLong = asked.length > LONGEST_QUERY ? findWords.wordsCut(LONGEST_QUERY) : '';
      say('find-words-note', found ? tooLong : findWords.noWord);
    } catch (error) {
      if (mine !== turn) return;
      found = null;
      sayBroken(error);
    }
    draw();
  }

  // browsers refuse to change the address as often as a drag would
  function keepAddress(): void {
    clearTimeout(writing);
    writing = setTimeout(() => {
      history.replaceState(null, '', `#${writeAddress(state, data)}`);
    }, ADDRESS_PAUSE);
  }

  function readFromAddress(): void {
    // a link to a part of this page asks for nothing
    if (document.getElementById(location.hash.slice(1))) {
      keepAddress();
      draw();
      return;
    }
    clearTimeout(writing);
    clearTimeout(pause);
    const read = readAddress(location.hash, data);
    if (read.state.words !== state.words) {
      turn++;
      found = null;
      say('find-words-note', '');
    }
    state = read.state;
    shown = FIRST;
    say('find-ignored', read.ignored.length > 0 ? findWords.ignored(read.ignored.join(' · ')) : '');
    draw();
    if (!found && state.words.trim() !== '') lookForWords();
  }

  const buttonIn = ({ target }: Event) => (target as Element).closest('button');

  form.addEventListener('submit', (event) => event.preventDefault());
  form.addEventListener('input', ({ target }) => {
    const { dataset, checked } = target as HTMLInputElement;
    if (dataset.column) become(withColumn(data, state, dataset.column, checked));
    else become(readFields(fields, state));
  });
  // strips in a folded part are not drawn until it opens
  form.addEventListener('toggle', () => drawStrips(state, results.rows), true);
  part('find-clear').addEventListener('click', () => become(NOTHING_ASKED));
  part('find-limits').addEventListener('click', (event) => {
    const next = results.dropped[Number(buttonIn(event)?.dataset.limit)];
    if (!next) return;
    become(next);
    // the button is gone; the keyboard goes on from the count
    part('find-count').focus();
  });
  part('find-table').addEventListener('click', (event) => {
    const by = buttonIn(event)?.dataset.sort;
    if (by === undefined) return;
    const again = state.sort?.by === by;
    const back = again && state.sort?.descending;
    become({ ...state, sort: back ? null : { by, descending: again } });
  });
  part('find-all').addEventListener('click', (event) => {
    const button = buttonIn(event);
    if (!button) return;
    const before = shown.rows;
    const more = button.dataset.more !== undefined;
    shown = { ...shown, rows: more ? before + MORE_ROWS : Number.POSITIVE_INFINITY };
    draw();
    // the button is gone; the keyboard goes on from the first row that is new
    focusRow(before);
  });
  part('find-pages-list').addEventListener('click', (event) => {
    if (!buttonIn(event)) return;
    shown = { ...shown, pages: shown.pages + MORE_PAGES };
    draw();
  });
  addEventListener('hashchange', readFromAddress);

  if (fields.words && !canSearch()) {
    fields.words.disabled = true;
    say('find-words-note', findWords.browserTooOld);
  }
  for (const id of ['find-form', 'find-results']) part(id).hidden = false;
  part('find-off').hidden = true;
  const narrow = !matchMedia('(min-width: 60rem)').matches;
  if (narrow) part('find-limits-box').removeAttribute('open');
  readFromAddress();
}
