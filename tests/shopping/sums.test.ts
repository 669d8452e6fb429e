import { describe, expect, test } from 'vitest';
import {
  costOf,
  readCounts,
  type ShoppingData,
  shoppingSums,
  wholeNumber,
  writeCounts,
} from '../../src/browser/shopping-sums.ts';

const DATA: ShoppingData = {
  materials: [
    { id: 'olive', name: 'Olive oil' },
    { id: 'alkali', name: 'Alkali' },
    { id: 'water', name: 'Water' },
  ],
  batches: [
    {
      code: 'T-1',
      name: 'One',
      size: 'small',
      label: 'Small',
      bars: 10,
      lines: [
        [0, 1000],
        [1, 130.5],
        [2, 260],
      ],
    },
    {
      code: 'T-1',
      name: 'One',
      size: 'large',
      label: 'Large',
      bars: null,
      lines: [
        [0, 20_000],
        [1, 2610],
        [2, 5200],
      ],
    },
    {
      code: 'T-2',
      name: 'Two',
      size: 'small',
      label: 'Small',
      bars: null,
      lines: [
        [1, 100],
        [2, 200],
      ],
    },
  ],
  prices: { currency: 'XTS', perKilogram: [6, null, 0] },
};

test('chosen batches add up', () => {
  // 3 x 1000, 3 x 130.5 + 2 x 100, 3 x 260 + 2 x 200
  expect([
    ...shoppingSums(
      DATA,
      new Map([
        [2, 2],
        [0, 3],
      ]),
    ),
  ]).toEqual([
    [0, 3000],
    [1, 591.5],
    [2, 1180],
  ]);
  expect(shoppingSums(DATA, new Map()).size).toBe(0);
});

describe('costs', () => {
  test('count what has a price and name what has none', () => {
    // 1 kg at 6, water at 0, alkali without a price
    expect(costOf(DATA, DATA.batches[0]?.lines ?? [])).toEqual({ cost: 6, unpriced: [1] });
  });

  test('are not there in an edition without prices', () => {
    expect(costOf({ prices: null }, [[0, 1000]])).toBeNull();
  });
});

describe('the address', () => {
  test('carries the choice there and back', () => {
    const counts = new Map([
      [0, 3],
      [2, 12],
    ]);
    expect(writeCounts(DATA, counts)).toBe('T-1.small=3&T-2.small=12');
    expect(readCounts(DATA, `#${writeCounts(DATA, counts)}`)).toEqual(counts);
  });

  test.each([
    '',
    '#',
    '#T-9.small=2',
    '#T-1.small=',
    '#T-1.small=-2',
    '#T-1.small=1e3',
    '#=',
    '#T-1.small=0',
  ])('that names no batch or no number chooses nothing: %s', (hash) =>
    expect(readCounts(DATA, hash).size).toBe(0),
  );
});

test.each([
  ['2', 2],
  [' 7 ', 7],
  ['999', 999],
  ['1000', 0],
  ['1.5', 0],
  ['', 0],
  ['two', 0],
])('"%s" is %d batches', (text, count) => expect(wholeNumber(text)).toBe(count));
