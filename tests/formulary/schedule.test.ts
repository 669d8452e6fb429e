import { expect, test } from 'vitest';
import type { Formula } from '../../src/formulary/formula.ts';
import { dayAfter, scheduleOf } from '../../src/formulary/schedule.ts';

const days = (targets: Formula['targets']) => scheduleOf({ targets } as Formula);
const target = (min: number, unit: 'h' | 'd' | 'min', max = min) => ({ min, max, unit });

test('lower ends count, a part of a day as a whole one', () => {
  expect(days({ unmould: target(24, 'h', 36), cure: target(42, 'd', 56) })).toEqual({
    cutFromDay: 1,
    releaseFromDay: 42,
  });
  expect(days({ unmould: target(25, 'h') }).cutFromDay).toBe(2);
  expect(days({ unmould: target(90, 'min') }).cutFromDay).toBe(1);
});

test('nothing is released before it may be cut, and no target gives no day', () => {
  expect(days({ unmould: target(3, 'd'), cure: target(0, 'd') }).releaseFromDay).toBe(3);
  expect(days({})).toEqual({ cutFromDay: null, releaseFromDay: null });
});

// by the calendar on the wall: 2028 is a leap year, 2027 is not
test.each([
  ['2026-12-01', 42, '2027-01-12'],
  ['2028-02-28', 1, '2028-02-29'],
  ['2027-02-28', 1, '2027-03-01'],
  ['2026-12-01', 0, '2026-12-01'],
])('%s and %i days is %s', (start, count, end) => {
  expect(dayAfter(start, count)).toBe(end);
});
