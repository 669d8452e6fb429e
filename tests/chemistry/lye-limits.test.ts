import { expect, test } from 'vitest';
import { lyeBoilingPoint, saturationAt } from '../../src/chemistry/lye-limits.ts';
import { celsius, fraction, grams } from '../../src/chemistry/quantity.ts';
import { reckon } from '../../src/chemistry/reckon.ts';
import { alkali, CONSTANTS, formulation } from '../support/materials.ts';
import { givenValue } from '../support/outcome.ts';

// round figures to reckon with by hand; the real tables are held by the tests of the data
const TABLES = {
  Na: {
    saturation: [
      [20, 46],
      [30, 53],
    ],
    boilingPoint: [
      [30, 117],
      [40, 128],
    ],
  },
  K: {
    saturation: [
      [20, 53],
      [25, 54],
    ],
    boilingPoint: [],
  },
} as const;
const charge = (wish: Parameters<typeof formulation>[0] = {}) =>
  givenValue(reckon(formulation(wish), grams(1000), CONSTANTS));
const MIXED = charge({
  alkali: [
    { supply: alkali('Na', 1), share: fraction(0.5) },
    { supply: alkali('K', 0.9), share: fraction(0.5) },
  ],
});

test('saturation lies on the line between the points', () => {
  expect(saturationAt(charge(), celsius(25), TABLES)).toBeCloseTo(0.495, 12);
});

test('of a mixed lye the less soluble alkali decides, and both must be known', () => {
  expect(saturationAt(MIXED, celsius(20), TABLES)).toBeCloseTo(0.46, 12);
  expect(saturationAt(MIXED, celsius(30), TABLES)).toBeNull();
  expect(saturationAt(charge(), celsius(31), TABLES)).toBeNull();
});

test('the boiling point is that of the lye in the pot; none for a mixed lye or past the table', () => {
  // 33 % of pure alkali: 117 + 11 x 0.3
  expect(lyeBoilingPoint(charge(), TABLES)).toBeCloseTo(120.3, 10);
  // with a quarter of the water held back 33 / (33 + 67 x 0.75) = 39.64 %
  expect(lyeBoilingPoint(charge({ holdBack: fraction(0.25) }), TABLES)).toBeCloseTo(127.6, 1);
  expect(lyeBoilingPoint(MIXED, TABLES)).toBeNull();
  expect(lyeBoilingPoint(charge({ holdBack: fraction(0.5) }), TABLES)).toBeNull();
});
