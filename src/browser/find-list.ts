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
export const FIRST_ROWS = 60;
/** So many more at a time: a table of thousands of rows takes seconds to be laid out. */
export const MORE_ROWS = 500;

/** The table that stands, what it was made for, and how to add rows to it. */
interface Standing {
  readonly key: string;
  readonly rows: readonly number[];
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

/** Lists the first `most` of the rows found: a screen of them at once, the others when that has been drawn. */
export function drawList(
  data: FinderData,
  state: FinderState,
  rows: readonly number[],
  most: number,
): void {
  const mine = ++turn;
  const listed = rows.slice(0, most);
  part('find-all').replaceChildren(...(listed.length < rows.length ? moreOf(listed, rows) : []));
  finish = () => {};
  if (rows.length === 0) {
    standing = null;
    part('find-table').replaceChildren();
    return;
  }
  const before = standing?.rows ?? [];
  const { table, body, rowOf } = tableFor(data, state, rows);
  table.setAttribute('aria-rowcount', `${rows.length + 1}`);
  const draw = (upTo: number) => {
    body.append(...listed.slice(body.rows.length, upTo).map(rowOf));
  };
  // rows that stand already stay, with the focus that one of them may have
  const same = before.length === rows.length && before.every((row, i) => row === rows[i]);
  if (!same || body.rows.length > listed.length) body.replaceChildren();
  draw(AT_ONCE);
  finish = () => draw(listed.length);
  afterDrawing(() => {
    if (mine === turn) finish();
  });
}

/** Gives the focus to the link of a row; draws it first where it was still to come. */
export function focusRow(place: number): void {
  finish();
  standing?.body.rows[place]?.querySelector('a')?.focus({ preventScroll: true });
}

const moreOf = (listed: readonly number[], rows: readonly number[]): readonly (Node | string)[] => [
  element('p', { class: 'label' }, findWords.listed(listed.length, rows.length)),
  ...(rows.length - listed.length > MORE_ROWS
    ? [element('button', { type: 'button', 'data-more': '' }, findWords.showMore(MORE_ROWS)), ' ']
    : []),
  element('button', { type: 'button' }, findWords.showAll(rows.length)),
];

/** The standing table, if its head says what is asked, or a new one. A head that has the focus keeps it. */
function tableFor(data: FinderData, state: FinderState, rows: readonly number[]): Standing {
  const columns = shownColumns(data, state);
  const key = JSON.stringify([columns.map(({ id }) => id), state.sort]);
  if (standing?.key === key) {
    standing = { ...standing, rows };
    return standing;
  }
  const place = part('find-table');
  const focused = place.contains(document.activeElement)
    ? document.activeElement?.getAttribute('data-sort')
    : null;
  const made = { key, rows, ...resultTable(state, columns), rowOf: rowMaker(data, columns) };
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
