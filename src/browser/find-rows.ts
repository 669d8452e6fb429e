import type { FinderData, Property } from '../search/finder/finder-data.ts';
import { findWords } from '../words/en/find.ts';
import { fixed } from '../words/numbers.ts';
import { addressOf } from './find-chunks.ts';
import { drawing, element } from './find-dom.ts';
import { valueText } from './find-text.ts';

const ACIDS = ['saturated', 'monounsaturated', 'polyunsaturated'];

/** Makes rows of the result table: each is a copy of one that was made by hand, which is several times as fast. */
export function rowMaker(
  data: FinderData,
  columns: readonly Property[],
): (row: number) => HTMLTableRowElement {
  const pattern = element(
    'tr',
    {},
    element('td', { class: 'code' }),
    element('th', { scope: 'row' }, element('a')),
    ...columns.map(() => element('td', { class: 'n' })),
    element('td'),
  );
  // the head says the unit
  const unitless = columns.map((property) => ({ ...property, unit: '' }));
  const bar = acidBars(data);
  return (row) => {
    const made = pattern.cloneNode(true) as HTMLTableRowElement;
    const [code, name, ...cells] = made.cells;
    const link = name?.firstElementChild as HTMLAnchorElement;
    const text = data.codes[row] ?? '';
    if (code) code.textContent = text;
    link.setAttribute('href', addressOf(`formulas/${text}.html`));
    link.textContent = data.names[row] ?? '';
    for (const [i, property] of unitless.entries()) {
      const cell = cells[i];
      if (cell) cell.textContent = valueText(property.values[row] ?? null, property);
    }
    cells.at(-1)?.append(bar(row));
    return made;
  };
}

/** Saturated, monounsaturated and polyunsaturated acids as one small bar. */
function acidBars(data: FinderData): (row: number) => Node {
  const shares = ACIDS.map((id) => data.properties.find((property) => property.id === id)?.values);
  const box = (name: string) => drawing('rect', { class: name, y: '1', height: '10' });
  const pattern = drawing(
    'svg',
    { class: 'find-acids', viewBox: '-1 0 102 12', role: 'img' },
    box('acid-saturated'),
    box('acid-mono'),
    box('acid-poly'),
  );
  return (row) => {
    const [saturated = null, mono = null, poly = null] = shares.map((values) => values?.[row]);
    if (saturated === null || mono === null || poly === null) {
      return document.createTextNode(findWords.noValue);
    }
    const picture = pattern.cloneNode(true) as SVGSVGElement;
    const label = findWords.acidsOf(fixed(saturated, 1), fixed(mono, 1), fixed(poly, 1));
    picture.setAttribute('aria-label', label);
    let from = 0;
    for (const [i, width] of [saturated, mono, poly].entries()) {
      picture.children[i]?.setAttribute('x', `${from}`);
      picture.children[i]?.setAttribute('width', `${width}`);
      from += width;
    }
    return picture;
  };
}
