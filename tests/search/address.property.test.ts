import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { readAddress, writeAddress } from '../../src/search/finder/address.ts';
import { PAGE_TYPES } from '../../src/search/finder/page-types.ts';
import type { FinderState } from '../../src/search/finder/state.ts';
import { FIXTURE as data } from './finder-fixture.ts';

const end = fc.option(fc.integer({ min: -9999, max: 9999 }).map((number) => number / 10));
const range = fc
  .record({ min: end, max: end })
  .filter(({ min, max }) => min !== null || max !== null);
const day = fc.option(fc.integer({ min: 0, max: 40_000 }));
const days = fc
  .record({ min: day, max: day })
  .filter(({ min, max }) => min !== null || max !== null);
const fats = fc.shuffledSubarray(['castor', 'coconut', 'olive', 'palm']);

const state: fc.Arbitrary<FinderState> = fc
  .record({
    words: fc.oneof(
      fc.string(),
      fc.string({ unit: 'binary' }).map((text) => text.toWellFormed()),
    ),
    where: fc.constantFrom(null, ...PAGE_TYPES),
    superfat: fc.option(range),
    review: fc.option(days),
    order: fats,
    split: fc.nat(4),
    only: fats,
    columns: fc.option(fc.subarray(['superfat', 'lye-temperature'])),
    sort: fc.option(
      fc.record({ by: fc.constantFrom('code', 'name', 'superfat'), descending: fc.boolean() }),
    ),
  })
  .map(({ words, where, superfat, review, order, split, only, columns, sort }) => ({
    words,
    where,
    ranges: {
      ...(superfat && { superfat }),
      ...(review && { 'review-by': review }),
    },
    choices:
      order.length + only.length === 0
        ? {}
        : { fats: { with: order.slice(0, split), without: order.slice(split), only } },
    columns,
    sort,
  }));

describe('addresses', () => {
  test('a state comes back from its address', () => {
    fc.assert(
      fc.property(state, (asked) => {
        const read = readAddress(`#${writeAddress(asked, data)}`, data);
        expect(read).toEqual({ state: asked, ignored: [] });
      }),
    );
  });

  test('any text is an address, and what is left of it comes back', () => {
    const parts = fc.constantFrom(
      'superfat',
      'fats',
      'kind',
      '=',
      '..',
      ',',
      '!',
      '&',
      '%',
      '%zz',
      '5',
    );
    const text = fc.oneof(
      fc.string({ unit: 'binary' }),
      fc.array(parts).map((list) => list.join('')),
    );
    fc.assert(
      fc.property(text, (address) => {
        const { state } = readAddress(address, data);
        expect(readAddress(writeAddress(state, data), data).state).toEqual(state);
      }),
    );
  });

  test.each([
    ['superfat=a..b', ['superfat=a..b']],
    ['where=nowhere', ['where=nowhere']],
    ['superfat=..', ['superfat=..']],
    ['superfat=1e9', ['superfat=1e9']],
    ['superfat=1..2..3', ['superfat=1..2..3']],
    ['review-by=2027-02-30', ['review-by=2027-02-30']],
    ['fats=unobtainium', ['fats=unobtainium']],
    ['fats-only=!olive', ['fats-only=!olive']],
    ['kind-only=bar', ['kind-only=bar']],
    ['columns=superfat,nothing', ['columns=superfat,nothing']],
    ['sort=-__proto__', ['sort=-__proto__']],
    ['constructor=1&__proto__=2', ['constructor=1', '__proto__=2']],
    ['%E0%A4%A', ['%E0%A4%A']],
    ['<script>alert(1)</script>', ['<script>alert(1)</script>']],
  ])('%s says nothing', (address, ignored) => {
    const read = readAddress(address, data);
    expect(read.ignored).toEqual(ignored);
    expect(read.state).toEqual(readAddress('', data).state);
  });
});
