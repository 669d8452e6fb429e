import type { FinderData } from '../search/finder/finder-data.ts';
import type { FinderState } from '../search/finder/state.ts';
import { findWords } from '../words/en/find.ts';
import { shownColumns } from './find-columns.ts';
import { element, part } from './find-dom.ts';
import { rowMaker } from './find-rows.ts';
import { resultTable } from './find-table.ts';

/** About a screen of rows: what is drawn before anything else is done. */
const AT_ONCE = 16;
/** Listed without being asked for. */
const FIRST_ROWS = 60;
/** So many more rows at a time, with a picture between, so that the page answers all the while. */
const STEP = 500;

/** The table that stands, what it was made for, and how to add rows to it. */
interface Standing {
  readonly key: string;
  readonly table: HTMLTableElement;
  readonly body: HTMLTableSectionElement;
  readonly rowOf: (row: number) => HTMLTableRowElement;
}

let standing: Standing | null = null;
/** Draws the rows that are still to come, at once. */
let finish = () => {};
let turn = 0;

// paper takes what is listed, not what has been drawn so far
addEventListener('beforeprint', () => finish());

/** Lists the rows found: the first ones at once, the others when the page has been drawn. */
export function drawList(
  data: FinderData,
  state: FinderState,
  rows: readonly number[],
  allRows: boolean,
): void {
  const mine = ++turn;
  const listed = allRows ? rows : rows.slice(0, FIRST_ROWS);
  part('find-all').replaceChildren(...(listed.length < rows.length ? moreOf(listed, rows) : []));
  if (rows.length === 0) {
    standing = null;
    finish = () => {};
    part('find-table').replaceChildren();
    return;
  }
  const { table, body, rowOf } = tableFor(data, state);
  table.setAttribute('aria-rowcount', `${rows.length + 1}`);
  let drawn = 0;
  const draw = (upTo: number) => {
    const more = listed.slice(drawn, upTo).map(rowOf);
    if (drawn === 0) body.replaceChildren(...more);
    else body.append(...more);
    drawn += more.length;
  };
  const goOn = () => {
    if (mine !== turn || drawn >= listed.length) return;
    draw(drawn + STEP);
    afterDrawing(goOn);
  };
  finish = () => draw(listed.length);
  draw(AT_ONCE);
  afterDrawing(goOn);
}

const moreOf = (listed: readonly number[], rows: readonly number[]) => [
  element('p', { class: 'label' }, findWords.listed(listed.length, rows.length)),
  element('button', { type: 'button' }, findWords.showAll(rows.length)),
];

/** The standing table, if its head says what is asked, or a new one. A head that has the focus keeps it. */
function tableFor(data: FinderData, state: FinderState): Standing {
  const columns = shownColumns(data, state);
  const key = JSON.stringify([columns.map(({ id }) => id), state.sort]);
  if (standing?.key === key) return standing;
  const place = part('find-table');
  const focused = place.contains(document.activeElement)
    ? document.activeElement?.getAttribute('data-sort')
    : null;
  const made = { key, ...resultTable(state, columns), rowOf: rowMaker(data, columns) };
  place.replaceChildren(made.table);
  if (focused) place.querySelector<HTMLElement>(`[data-sort="${focused}"]`)?.focus();
  standing = made;
  return made;
}

/** Calls back when what has been changed is on the screen, or soon where the page is not looked at. */
function afterDrawing(then: () => void): void {
  if (document.hidden) setTimeout(then);
  else requestAnimationFrame(() => setTimeout(then));
}
