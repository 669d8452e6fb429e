import './speak.ts';
import { shopping as text } from '../words/en/shopping.ts';
import { element, part } from './find-dom.ts';
import {
  type Counts,
  costOf,
  readCounts,
  type ShoppingData,
  shoppingSums,
  wholeNumber,
  writeCounts,
} from './shopping-sums.ts';

declare global {
  /** Set by the data script of the shopping page. */
  var handbookShopping: ShoppingData | undefined;
}

if (globalThis.handbookShopping) start(globalThis.handbookShopping);
else part('shopping-off').textContent = text.broken;

function start(data: ShoppingData): void {
  const form = part('shopping-form');
  const fields = [...form.querySelectorAll<HTMLInputElement>('input[data-batch]')];
  const placeOf = (field: HTMLInputElement) => Number(field.dataset.batch);

  const counts = (): Counts =>
    new Map(
      fields
        .map((field) => [placeOf(field), wholeNumber(field.value)] as const)
        .filter(([, count]) => count > 0),
    );
  const fill = (wanted: Counts) => {
    for (const field of fields) field.value = String(wanted.get(placeOf(field)) ?? '');
    draw();
  };
  const draw = () => {
    const wanted = counts();
    part('shopping-list').replaceChildren(...list(data, wanted));
  };

  form.addEventListener('input', () => {
    const address = writeCounts(data, counts());
    history.replaceState(null, '', address === '' ? location.pathname : `#${address}`);
    draw();
  });
  form.addEventListener('submit', (event) => event.preventDefault());
  part('shopping-clear').addEventListener('click', () => {
    history.replaceState(null, '', location.pathname);
    fill(new Map());
  });
  addEventListener('hashchange', () => fill(readCounts(data, location.hash)));

  part('shopping-off').hidden = true;
  for (const id of ['shopping-choose', 'shopping-ready']) part(id).hidden = false;
  // the list is what is printed; the tables of all batches are for reading
  part('shopping-batches').classList.add('screen');
  fill(readCounts(data, location.hash));
}

function list(data: ShoppingData, counts: Counts): readonly Node[] {
  if (counts.size === 0) return [element('p', {}, text.nothing)];
  const sums = shoppingSums(data, counts);
  const total = costOf(data, sums);
  const { prices } = data;
  const money = (amount: number) => text.money(amount, prices?.currency ?? '');
  const nameOf = (place: number) => data.materials[place]?.name ?? '';
  const chosen = [...counts].flatMap(([place, count]) => {
    const batch = data.batches[place];
    if (!batch) return [];
    return [element('li', {}, text.chosen(count, batch.code, batch.name, batch.label))];
  });
  const head = (name: string, kind: string | null = null) =>
    element('th', { scope: 'col', class: kind }, name);
  const rows = [...sums].map(([place, grams]) => {
    const line = costOf(data, [[place, grams]]);
    return element(
      'tr',
      {},
      element('th', { scope: 'row' }, nameOf(place)),
      element('td', { class: 'n' }, element('b', {}, text.kilograms(grams))),
      element('td', { class: 'to-fill' }),
      element('td', { class: 'to-fill' }),
      line && element('td', { class: 'n' }, line.unpriced.length > 0 ? '–' : money(line.cost)),
    );
  });
  return [
    element('ul', {}, ...chosen),
    element(
      'table',
      { class: 'list' },
      element(
        'thead',
        {},
        element(
          'tr',
          {},
          head(text.material),
          head(text.weight, 'n'),
          head(text.stock),
          head(text.order),
          total && head(text.cost, 'n'),
        ),
      ),
      element('tbody', {}, ...rows),
    ),
    ...(total ? [element('p', {}, element('b', {}, `${text.cost}: ${money(total.cost)}`))] : []),
    ...(total && total.unpriced.length > 0
      ? [element('p', {}, text.unpriced(total.unpriced.map(nameOf)))]
      : []),
  ];
}
