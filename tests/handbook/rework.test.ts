import { expect, test } from 'vitest';
import { reworkLimit } from '../../src/handbook/rework.ts';
import { sheetWords } from '../../src/words/en/sheet.ts';

const batch = { total: 1499 };

test('the lower of the shop’s cap and the formula’s own limit holds', () => {
  expect(reworkLimit({ rework: null }, batch, { reworkCap: 10 })?.percent).toBe(10);
  expect(reworkLimit({ rework: 5 }, batch, { reworkCap: 10 })).toEqual({
    percent: 5,
    mass: 74.95,
  });
  expect(reworkLimit({ rework: 20 }, batch, { reworkCap: 10 })?.percent).toBe(10);
  expect(reworkLimit({ rework: 5 }, batch, {})?.percent).toBe(5);
});

test('no limit is made up, neither where none is stated nor where nothing is weighed', () => {
  expect(reworkLimit({ rework: null }, batch, {})).toBeNull();
  expect(reworkLimit({ rework: 5 }, { total: null }, { reworkCap: 10 })).toBeNull();
});

test('the mass on the sheet is never rounded up', () => {
  expect(sheetWords.record.reworkAtMost(10, 149.9)).toContain('at most 10 %, 149 g');
});
