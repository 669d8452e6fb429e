import fc from 'fast-check';
import { expect, test } from 'vitest';
import type { FormulaDocument } from '../../src/formulary/document.ts';
import { acidChart } from '../../src/handbook/acid-chart.ts';
import { marginPicture, marginVerdict } from '../../src/handbook/margin-picture.ts';
import { DOCUMENT, REFERENCE } from './fixture.ts';

const withMargin = (
  written: number,
  expanded: readonly [number, number],
  worstCase: readonly [number, number],
) => ({ ...DOCUMENT, superfat: { ...DOCUMENT.superfat, written, expanded, worstCase } });

test('zero is always on the axis and everything keeps its order and its distance', () => {
  const percent = fc.double({ min: -10, max: 30, noNaN: true });
  fc.assert(
    fc.property(percent, percent, percent, percent, percent, (...values) => {
      const [a, b, c, d, e] = values.toSorted((x, y) => x - y) as [
        number,
        number,
        number,
        number,
        number,
      ];
      const picture = marginPicture(withMargin(c, [b, d], [a, e]));
      const places = [
        picture.worst[0],
        picture.expanded[0],
        picture.written,
        picture.expanded[1],
        picture.worst[1],
      ];
      expect(places).toEqual(places.toSorted((x, y) => x - y));
      for (const place of [...places, picture.zero]) {
        expect(place).toBeGreaterThan(0);
        expect(place).toBeLessThan(100);
      }
      const [first, second] = picture.ticks;
      if (!first || !second) throw new Error('no ticks');
      const perPoint = (second.at - first.at) / (second.value - first.value);
      expect(picture.zero + c * perPoint).toBeCloseTo(picture.written, 1);
    }),
  );
});

test.each([
  [[1, 9], [0.1, 9], 'clear'],
  [[1, 9], [-0.1, 9], 'worst'],
  [[-0.1, 9], [-2, 9], 'expanded'],
] as const)('expanded %j and worst case %j are judged %s', (expanded, worst, verdict) => {
  expect(marginVerdict(withMargin(5, expanded, worst))).toBe(verdict);
});

test('acids stand by class, then chain length; sums and the longest bar are right', () => {
  const groups = acidChart(DOCUMENT, REFERENCE);
  expect(groups?.map(({ name, share }) => [name, share])).toEqual([
    ['saturated', 24],
    ['monounsaturated', 61.97],
    ['polyunsaturated', 10],
    ['hydroxy', 4],
  ]);
  expect(groups?.[1]?.bars[0]).toMatchObject({ name: 'oleic acid', width: 100 });
  expect(groups?.[0]?.bars[0]?.width).toBeCloseTo((100 * 24) / 61.97, 1);
});

test('no profile, no chart', () => {
  const document: FormulaDocument = { ...DOCUMENT, profile: null };
  expect(acidChart(document, REFERENCE)).toBeNull();
});
