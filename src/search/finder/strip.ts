import type { Property } from './finder-data.ts';

/** A strip is drawn in this many steps from the lowest to the highest value. */
export const STRIP_WIDTH = 400;
export const STRIP_HEIGHT = 24;

/** The lowest and the highest value of the formulary; `null` where no formula has one. */
export interface Span {
  readonly low: number;
  readonly high: number;
}

export function spanOf({ values }: Property): Span | null {
  let low = Number.POSITIVE_INFINITY;
  let high = Number.NEGATIVE_INFINITY;
  for (const value of values) {
    if (value === null) continue;
    low = Math.min(low, value);
    high = Math.max(high, value);
  }
  return low <= high ? { low, high } : null;
}

/** Where a value stands on the strip, in steps; the middle where all are alike. Beyond the ends, the end. */
export function placeOn(span: Span, value: number): number {
  if (span.high === span.low) return STRIP_WIDTH / 2;
  const share = (value - span.low) / (span.high - span.low);
  return Math.round(Math.min(1, Math.max(0, share)) * STRIP_WIDTH);
}

/** The value at a place, to the decimals that are shown. */
export function valueAt(span: Span, place: number, decimals: number): number {
  const value = span.low + (place / STRIP_WIDTH) * (span.high - span.low);
  return Number(value.toFixed(decimals));
}

/** Where each row stands on the strip; -1 where it has no number. */
export const placesOn = ({ values }: Property, span: Span): Int16Array =>
  Int16Array.from(values, (value) => (value === null ? -1 : placeOn(span, value)));

/** How many rows stand at each step of the strip. */
export function countsOn(places: Int16Array, rows: Iterable<number>): Uint32Array {
  const counts = new Uint32Array(STRIP_WIDTH + 1);
  for (const row of rows) {
    const place = places[row] ?? -1;
    if (place >= 0) counts[place] = (counts[place] ?? 0) + 1;
  }
  return counts;
}

/** SVG path of one upright mark per step; a mark grows with the root of the rows it stands for, up to `tallest`. */
export function marksPath(counts: Uint32Array, tallest: number): string {
  let path = '';
  for (let place = 0; place < counts.length; place++) {
    const count = counts[place] ?? 0;
    if (count === 0) continue;
    const share = tallest > 1 ? (Math.sqrt(count) - 1) / (Math.sqrt(tallest) - 1) : 0;
    const height = Math.round(STRIP_HEIGHT * (0.45 + 0.55 * Math.min(1, share)));
    path += `M${place} ${STRIP_HEIGHT}v-${height}`;
  }
  return path;
}
