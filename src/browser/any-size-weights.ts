import type { Sized } from '../chemistry/any-size.ts';
import { anySizeWords as text } from '../words/en/any-size.ts';
import { massUnit, stepDecimals } from '../words/measures.ts';
import { splitAtPoint } from '../words/numbers.ts';
import type { AnySizeData } from './any-size-data.ts';
import { decimalsIn, type ShownGroup, type ShownLine, shownGroups } from './any-size-lines.ts';
import { element } from './find-dom.ts';

/** A page on which weights are read, or a sheet with cells to write in. */
export type Shape = 'block' | 'sheet';

/** Cells after the weight that are written in: lot, what the scale showed, who weighed and who saw. */
const TO_WRITE = 4;

/** The table of weights of a size, as the listed sizes have theirs. */
export function weightsTable(
  { weighed }: Sized,
  data: AnySizeData,
  name: string,
  shape: Shape,
): HTMLElement {
  const caption = text.caption(data.code, name);
  const groups = shownGroups(weighed, data);
  const decimals = decimalsIn(groups);
  const bodies = groups.map((group) => body(group, decimals, shape));
  if (shape === 'block') {
    return element(
      'table',
      { class: 'weights' },
      element('caption', { class: 'unseen' }, caption),
      ...bodies,
    );
  }
  const head = cloned('weigh-head');
  return element('table', { class: 'weigh', 'aria-label': caption }, head, ...bodies);
}

/** A copy of a part that the page has ready; `null` where it has none. */
function cloned(id: string): Node | null {
  const template = document.getElementById(id);
  return template instanceof HTMLTemplateElement ? template.content.cloneNode(true) : null;
}

function body({ title, group, lines }: ShownGroup, decimals: number, shape: Shape) {
  const width = shape === 'sheet' ? TO_WRITE + 3 : 2;
  const halt = shape === 'sheet' ? cloned(`halt-${group}`) : null;
  return element(
    'tbody',
    { class: `group-${group}` },
    element(
      'tr',
      {},
      element('th', { class: 'group', colspan: String(width), scope: 'rowgroup' }, title),
    ),
    halt,
    ...lines.map((line) => row(line, decimals, shape)),
  );
}

function row({ id, name, lot, text: weight, step }: ShownLine, decimals: number, shape: Shape) {
  const own = stepDecimals(step);
  const sheet = shape === 'sheet';
  return element(
    'tr',
    { 'data-material': id },
    sheet ? element('td', { class: 'tick' }) : null,
    element(
      'th',
      { scope: 'row' },
      name,
      ...(lot === null ? [] : [' ', element('span', { class: 'lot' }, text.lot(lot))]),
    ),
    element(
      'td',
      { class: 'n' },
      ...figures(weight, own < decimals ? `pad-${own}${decimals}` : ''),
      element('span', { class: 'unit' }, `\u00a0${massUnit()}`),
    ),
    ...(sheet ? Array.from({ length: TO_WRITE }, () => element('td', { class: 'write' })) : []),
  );
}

/** Of pounds and ounces the pounds come first, with a unit of their own. */
function figures(weight: string, pad: string): readonly Node[] {
  const [last = '', pounds] = weight.split('\u00a0lb\u00a0').reverse();
  if (pounds === undefined) return [element('span', { class: pad || null }, last)];
  const first = splitAtPoint(last)[0].length < 2 ? ' pad-first' : '';
  return [
    element('span', {}, pounds),
    element('span', { class: 'unit' }, '\u00a0lb\u00a0'),
    element('span', { class: `${pad}${first}` }, last),
  ];
}
