import { describe, expect, test } from 'vitest';
import { interpolate } from '../../src/chemistry/interpolate.ts';
import { type LyeHeatTables, lyeHeat } from '../../src/chemistry/lye-heat.ts';
import { celsius, fraction, grams } from '../../src/chemistry/quantity.ts';
import { reckon } from '../../src/chemistry/reckon.ts';
import { alkali, CITRIC_MONOHYDRATE, CONSTANTS, formulation } from '../support/materials.ts';
import { givenValue } from '../support/outcome.ts';

/** Two points of each table are enough to reckon by hand; the real tables are held by tests of the data. */
const TABLES: Record<'Na' | 'K', LyeHeatTables> = {
  Na: {
    heatOfSolution: [
      [4, 34.43],
      [10, 42.51],
    ],
    newerSetAdds: 1.6,
    heatCapacities: [
      [
        [20, 3.62],
        [30, 3.53],
        [40, 3.36],
      ],
    ],
    saturation: [],
    boilingPoint: [
      [30, 117],
      [40, 128],
    ],
  },
  K: { heatOfSolution: [], newerSetAdds: 0, heatCapacities: [], saturation: [], boilingPoint: [] },
};
const heatOf = (wish: Parameters<typeof formulation>[0]) =>
  lyeHeat(
    givenValue(reckon(formulation(wish), grams(1000), CONSTANTS)),
    celsius(20),
    TABLES,
    CONSTANTS,
  );

describe('lye heat', () => {
  test('one mol of NaOH in four of water, by hand', () => {
    // 39.997 g + 72.06 g = 112.06 g at 35.69 %: c = 3.4333 by the table above;
    // cool set 34.43 kJ / (112.06 g x 3.4333) = 89.5 K; hot set 36.03 kJ: 93.6 K
    const heat = givenValue(
      heatOf({
        water: { form: 'per-alkali', value: (4 * CONSTANTS.water) / CONSTANTS.hydroxide.Na },
      }),
    );
    expect(heat.coolest).toBeCloseTo(20 + 34430 / (112.057 * 3.43327), 1);
    expect(heat.peak).toBeCloseTo(20 + 36030 / (112.057 * 3.43327), 1);
    expect(heat.boilingPoint).toBeCloseTo(117 + 11 * 0.569, 0);
  });

  test('acid in the lye adds the heat of its neutralisation', () => {
    const acid = {
      additives: [{ additive: CITRIC_MONOHYDRATE, perFats: fraction(0.02), at: 'lye' as const }],
    };
    expect(givenValue(heatOf(acid)).peak).toBeGreaterThan(givenValue(heatOf({})).peak + 5);
  });

  test('holding water back makes the pot hotter', () => {
    const held = heatOf({
      water: { form: 'lye-concentration', value: fraction(0.3) },
      holdBack: fraction(0.15),
    });
    const whole = heatOf({ water: { form: 'lye-concentration', value: fraction(0.3) } });
    expect(givenValue(held).peak).toBeGreaterThan(givenValue(whole).peak);
  });

  test('gives no number for potassium, for a stock, or past the end of a table', () => {
    const refusal = (wish: Parameters<typeof formulation>[0]) => {
      const heat = heatOf(wish);
      return heat.ok ? null : heat.breach.rule;
    };
    expect(refusal({ alkali: [{ supply: alkali('K', 0.9), share: fraction(1) }] })).toBe(
      'no-lye-heat-data',
    );
    expect(
      refusal({
        alkali: [{ supply: alkali('Na', 0.5, { form: 'solution' }), share: fraction(1) }],
      }),
    ).toBe('lye-heat-of-stock');
    expect(refusal({ water: { form: 'lye-concentration', value: fraction(0.45) } })).toBe(
      'lye-heat-out-of-range',
    );
  });
});

test('interpolation is straight between points and silent outside them', () => {
  const curve = [
    [0, 0],
    [10, 100],
    [20, 110],
  ] as const;
  expect(interpolate(curve, 5)).toBe(50);
  expect(interpolate(curve, 10)).toBe(100);
  expect(interpolate(curve, 20)).toBe(110);
  expect(interpolate(curve, 20.1)).toBeNull();
  expect(interpolate(curve, -1)).toBeNull();
  expect(interpolate([], 1)).toBeNull();
});
