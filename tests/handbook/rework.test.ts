import { expect, test } from 'vitest';
import { reworkLimit } from '../../src/handbook/rework.ts';
import { sheetWords } from '../../src/words/en/sheet.ts';

const batch = { total: 1499, afterCookFats: [], liquids: [], additives: [] };

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
  expect(reworkLimit({ rework: 5 }, { ...batch, total: null }, { reworkCap: 10 })).toBeNull();
});

test('what joins after the cook or in the dilution is no part of the batter', () => {
  const line = (weighedMass: number, at: string) => ({ id: 'any', weighedMass, step: 1, at });
  const cooked = {
    total: 3000,
    afterCookFats: [{ id: 'any', weighedMass: 100, step: 1 }],
    liquids: [line(1500, 'dilution'), line(200, 'lye')],
    additives: [line(50, 'after-cook'), line(20, 'trace')],
  };
  // 3000 - 100 - 1500 - 50 = 1350 g
  expect(reworkLimit({ rework: 10 }, cooked, {})?.mass).toBeCloseTo(135, 9);
});

test('the mass on the sheet is never rounded up', () => {
  expect(sheetWords.record.reworkAtMost(10, 149.9)).toContain('at most 10 %, 149 g');
});
