import type { FinderData, Property } from '../search/finder/finder-data.ts';
import { type FinderState, type Range, withRange } from '../search/finder/state.ts';
import {
  countsOn,
  marksPath,
  placeOn,
  placesOn,
  type Span,
  STRIP_HEIGHT,
  STRIP_WIDTH,
  spanOf,
  valueAt,
} from '../search/finder/strip.ts';
import { drawing } from './find-dom.ts';

/** Draws the rows that are found, and the range in force. */
export type DrawStrips = (state: FinderState, rows: readonly number[]) => void;

/** Puts a strip into every property's place; `change` is called when a range is drawn by dragging. */
export function strips(
  data: FinderData,
  form: HTMLElement,
  change: (change: (state: FinderState) => FinderState) => void,
): DrawStrips {
  const drawers = data.properties.flatMap((property) => {
    const place = form.querySelector<HTMLElement>(`[data-property="${property.id}"] .strip`);
    const span = spanOf(property);
    return place && span ? [strip(property, span, place, data.codes.keys(), change)] : [];
  });
  return (state, rows) => {
    for (const draw of drawers) draw(state, rows);
  };
}

function strip(
  property: Property,
  span: Span,
  place: HTMLElement,
  all: Iterable<number>,
  change: (change: (state: FinderState) => FinderState) => void,
): DrawStrips {
  const places = placesOn(property, span);
  const allCounts = countsOn(places, all);
  const tallest = Math.max(...allCounts);
  const band = drawing('rect', { class: 'strip-range', y: '0', height: `${STRIP_HEIGHT}` });
  const found = drawing('path', { class: 'strip-found' });
  const picture = drawing(
    'svg',
    {
      viewBox: `-2 0 ${STRIP_WIDTH + 4} ${STRIP_HEIGHT}`,
      preserveAspectRatio: 'none',
      'aria-hidden': 'true',
    },
    band,
    drawing('path', { class: 'strip-all', d: marksPath(allCounts, tallest) }),
    found,
  );
  place.replaceChildren(picture);
  dragging(picture, (from, to) =>
    change((state) =>
      withRange(state, property.id, {
        min: valueAt(span, from, property.decimals),
        max: valueAt(span, to, property.decimals),
      }),
    ),
  );
  return (state, rows) => {
    if (place.closest('details')?.open === false) return;
    found.setAttribute('d', marksPath(countsOn(places, rows), tallest));
    const range = state.ranges[property.id];
    const [left, right] = range ? ends(range, span) : [0, 0];
    band.setAttribute('x', `${left}`);
    band.setAttribute('width', `${range ? Math.max(right - left, 2) : 0}`);
  };
}

const ends = ({ min, max }: Range, span: Span): readonly [number, number] => [
  min === null ? -2 : placeOn(span, min),
  max === null ? STRIP_WIDTH + 2 : placeOn(span, max),
];

/** Calls `drag` with the lower and the upper place while a pointer is drawn over the strip. */
function dragging(picture: SVGSVGElement, drag: (from: number, to: number) => void): void {
  let start: number | null = null;
  const placeAt = ({ clientX }: PointerEvent) => {
    const { left, width } = picture.getBoundingClientRect();
    return Math.min(STRIP_WIDTH, Math.max(0, ((clientX - left) / width) * STRIP_WIDTH));
  };
  picture.addEventListener('pointerdown', (event) => {
    start = placeAt(event);
    picture.setPointerCapture(event.pointerId);
  });
  picture.addEventListener('pointermove', (event) => {
    if (start === null) return;
    const here = placeAt(event);
    // a tap is not a range
    if (Math.abs(here - start) > 3) drag(Math.min(start, here), Math.max(start, here));
  });
  for (const end of ['pointerup', 'pointercancel']) {
    picture.addEventListener(end, () => {
      start = null;
    });
  }
}
