import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { bandsOf } from '../../src/search/finder/bands.ts';
import { dateOf, dayOf, type Property } from '../../src/search/finder/finder-data.ts';
import {
  countsOn,
  marksPath,
  placeOn,
  placesOn,
  STRIP_WIDTH,
  spanOf,
  valueAt,
} from '../../src/search/finder/strip.ts';

const property = (
  values: readonly (number | null)[],
  format: 'number' | 'date' = 'number',
): Property => ({
  id: 'superfat',
  name: 'Superfat',
  unit: '%',
  group: 'Superfat',
  format,
  decimals: 1,
  values,
});

describe('bands', () => {
  test('of round widths, empty ones left out', () => {
    const bands = bandsOf(property([5, 0, 18, 5.5, null, 4.9]));
    expect(bands).toEqual([
      { from: 0, to: 2, rows: [1] },
      { from: 4, to: 6, rows: [5, 0, 3] },
      { from: 18, to: 20, rows: [2] },
    ]);
  });

  test('of dates by calendar months', () => {
    const days = ['2027-01-31', '2026-12-01', '2027-03-01', '2027-01-01'].map(dayOf);
    const bands = bandsOf(property(days, 'date'));
    expect(bands.map(({ from, rows }) => [dateOf(from), rows])).toEqual([
      ['2026-12-01', [1]],
      ['2027-01-01', [3, 0]],
      ['2027-03-01', [2]],
    ]);
  });

  test('every number is in one band, and within it', () => {
    const value = fc.integer({ min: -99_999, max: 99_999 }).map((number) => number / 10);
    fc.assert(
      fc.property(fc.array(fc.option(value)), (values) => {
        const bands = bandsOf(property(values));
        const rows = bands.flatMap((band) => band.rows);
        expect(new Set(rows).size).toBe(rows.length);
        expect(rows.length).toBe(values.filter((each) => each !== null).length);
        for (const { from, to, rows } of bands) {
          for (const row of rows) {
            expect(values[row]).toBeGreaterThanOrEqual(from);
            expect(values[row]).toBeLessThan(to);
          }
        }
        expect(bands.length).toBeLessThanOrEqual(14);
      }),
    );
  });
});

describe('strips', () => {
  test('the ends of the formulary are the ends of the strip', () => {
    const span = spanOf(property([5, null, 18, 1]));
    expect(span).toEqual({ low: 1, high: 18 });
    if (!span) return;
    expect([1, 18, -5, 99].map((value) => placeOn(span, value))).toEqual([
      0,
      STRIP_WIDTH,
      0,
      STRIP_WIDTH,
    ]);
    expect(valueAt(span, STRIP_WIDTH / 2, 1)).toBe(9.5);
  });

  test('every row with a number is counted, one mark per step', () => {
    const values = [5, 5, null, 18, 1];
    const span = spanOf(property(values)) ?? { low: 0, high: 0 };
    const counts = countsOn(placesOn(property(values), span), values.keys());
    expect([...counts].reduce((sum, count) => sum + count, 0)).toBe(4);
    expect(marksPath(counts, 2).match(/M/g)).toHaveLength(3);
  });

  test('no number, no strip; one number, one mark in the middle', () => {
    expect(spanOf(property([null, null]))).toBeNull();
    expect(placeOn({ low: 7, high: 7 }, 7)).toBe(STRIP_WIDTH / 2);
  });
});
