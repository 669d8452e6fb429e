import type { FinderData, Property } from '../search/finder/finder-data.ts';
import type { FinderState, Sort } from '../search/finder/state.ts';
import { findWords } from '../words/en/find.ts';
import { fixed } from '../words/numbers.ts';
import { addressOf } from './find-chunks.ts';
import { drawing, element } from './find-dom.ts';
import { valueText } from './find-text.ts';

/** Rows drawn at first: more than fit a screen, few enough to redraw while a range is dragged. */
export const FIRST_ROWS = 60;

/** The table of the rows found, with the chosen properties as columns. */
export function resultTable(
  data: FinderData,
  state: FinderState,
  rows: readonly number[],
  columns: readonly Property[],
): HTMLTableElement {
  const { columns: names } = findWords;
  return element(
    'table',
    { class: 'list find-table' },
    element('caption', {}, findWords.acidsNote),
    element(
      'thead',
      {},
      element(
        'tr',
        {},
        head(names.code, 'code', state.sort, ''),
        head(names.name, 'name', state.sort, ''),
        ...columns.map(({ name, id, unit }) => head(name, id, state.sort, unit)),
        element('th', { scope: 'col' }, names.acids),
      ),
    ),
    element('tbody', {}, ...rows.map((row) => bodyRow(data, row, columns))),
  );
}

function head(name: string, id: string, sort: Sort | null, unit: string) {
  const sorted = sort?.by === id ? (sort.descending ? 'descending' : 'ascending') : null;
  const button = element('button', { type: 'button', 'data-sort': id }, name);
  const isText = id === 'code' || id === 'name';
  return element(
    'th',
    { scope: 'col', 'aria-sort': sorted, class: isText ? null : 'n' },
    button,
    unit === '' ? null : element('span', { class: 'unit' }, ` ${unit}`),
  );
}

function bodyRow(data: FinderData, row: number, columns: readonly Property[]) {
  const code = data.codes[row] ?? '';
  return element(
    'tr',
    {},
    element('td', { class: 'code' }, code),
    element(
      'th',
      { scope: 'row' },
      element('a', { href: addressOf(`formulas/${code}.html`) }, data.names[row] ?? ''),
    ),
    ...columns.map((property) =>
      element(
        'td',
        { class: 'n' },
        valueText(property.values[row] ?? null, { ...property, unit: '' }),
      ),
    ),
    element('td', {}, acidBar(data, row)),
  );
}

/** Saturated, monounsaturated and polyunsaturated acids as one small bar. */
function acidBar(data: FinderData, row: number): Node {
  const shares = ['saturated', 'monounsaturated', 'polyunsaturated'].map(
    (id) => data.properties.find((property) => property.id === id)?.values[row] ?? null,
  );
  const [saturated = null, mono = null, poly = null] = shares;
  if (saturated === null || mono === null || poly === null) {
    return document.createTextNode(findWords.noValue);
  }
  const label = findWords.acidsOf(fixed(saturated, 1), fixed(mono, 1), fixed(poly, 1));
  const box = (name: string, from: number, width: number) =>
    drawing('rect', { class: name, x: `${from}`, y: '1', width: `${width}`, height: '10' });
  return drawing(
    'svg',
    { class: 'find-acids', viewBox: '-1 0 102 12', role: 'img', 'aria-label': label },
    box('acid-saturated', 0, saturated),
    box('acid-mono', saturated, mono),
    box('acid-poly', saturated + mono, poly),
  );
}
