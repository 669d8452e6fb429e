import type { Property } from '../search/finder/finder-data.ts';
import type { FinderState, Sort } from '../search/finder/state.ts';
import { findWords } from '../words/en/find.ts';
import { element } from './find-dom.ts';

/** An empty table with the chosen properties as columns. */
export function resultTable(
  state: FinderState,
  columns: readonly Property[],
): { readonly table: HTMLTableElement; readonly body: HTMLTableSectionElement } {
  const { columns: names } = findWords;
  const body = element('tbody');
  const table = element(
    'table',
    { class: 'list find-table', 'aria-label': findWords.results },
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
    body,
  );
  return { table, body };
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
