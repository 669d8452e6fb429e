import { describe, expect, test } from 'vitest';
import { readAddress } from '../../src/search/finder/address.ts';
import { answer, inOrder } from '../../src/search/finder/answer.ts';
import { limitsOf } from '../../src/search/finder/limits.ts';
import { FIXTURE as data } from './finder-fixture.ts';

function ask(address: string, found: readonly string[] | null = null) {
  const { state, ignored } = readAddress(address, data);
  expect(ignored).toEqual([]);
  const rows = found && new Set(found.map((code) => data.codes.indexOf(code)));
  const limits = limitsOf(state, data, rows);
  const given = answer(data, limits);
  return {
    codes: inOrder(given.rows, data, state.sort, null).map((row) => data.codes[row]),
    without: given.withoutLimit,
    limits,
  };
}

describe('answers, each worked out by hand from the six formulas', () => {
  test.each([
    ['', ['A-1', 'A-2', 'A-3', 'B-1', 'B-2', 'C-1']],
    ['superfat=5', ['A-1', 'A-3']],
    ['superfat=2.5..5', ['A-1', 'A-3', 'B-2']],
    ['superfat=..2.5', ['B-1', 'B-2']],
    ['superfat=6.6..', ['C-1']],
    ['lye-temperature=-100..', ['A-1', 'A-3', 'B-2', 'C-1']],
    ['lye-temperature=..-1', ['C-1']],
    ['review-by=..2027-01-31', ['A-1', 'B-1']],
    ['kind=paste,liquid', ['B-1', 'B-2']],
    ['fats=olive,castor', ['A-2']],
    ['fats=olive,!castor', ['A-1', 'A-3', 'C-1']],
    ['fats=!palm,!castor', ['A-1', 'A-3', 'B-2']],
    ['fats-only=olive,coconut', ['A-1', 'A-3', 'B-2']],
    ['fats-only=olive,coconut&fats=coconut&kind=bar', ['A-1']],
    ['superfat=8..2', []],
    ['sort=-superfat', ['C-1', 'A-2', 'A-1', 'A-3', 'B-2', 'B-1']],
    ['sort=name', ['A-2', 'B-2', 'C-1', 'B-1', 'A-3', 'A-1']],
    ['sort=lye-temperature', ['C-1', 'B-2', 'A-1', 'A-3', 'A-2', 'B-1']],
    ['sort=-lye-temperature', ['A-3', 'A-1', 'B-2', 'C-1', 'A-2', 'B-1']],
  ])('%s', (address, codes) => expect(ask(address).codes).toEqual(codes));

  test('words and ranges together', () =>
    expect(ask('words=lamp&superfat=5', ['A-3', 'C-1']).codes).toEqual(['A-3']));
});

describe('what dropping a limit would bring', () => {
  test('one that stands alone in the way', () => {
    const { codes, without } = ask('superfat=5..&fats=!castor,!palm&kind=bar');
    expect(codes).toEqual(['A-1', 'A-3']);
    // without superfat: nothing new; without castor: A-2; without palm: C-1; without kind: nothing new
    expect(without).toEqual([2, 2, 3, 3]);
  });

  test.each([
    'superfat=9..',
    'superfat=5&fats=palm&kind=paste',
    'fats=castor,palm&review-by=2027-01-01..',
    'fats-only=castor&superfat=..1&lye-temperature=0..',
  ])('%s: as many as the search without it finds', (address) => {
    const { limits, without } = ask(address);
    for (const [place, { dropped }] of limits.entries()) {
      const rest = answer(data, limitsOf(dropped, data, null));
      expect(rest.rows.length).toBe(without[place]);
    }
  });
});
