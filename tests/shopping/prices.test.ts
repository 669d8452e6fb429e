import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, describe, expect, test } from 'vitest';
import { costOf } from '../../src/browser/shopping-sums.ts';
import { readPrices } from '../../src/reference/prices-fs.ts';
import { finderData } from '../../src/site/find/finder-data.ts';
import { shoppingData } from '../../src/site/shopping/shopping-data.ts';
import { computedWith, REFERENCE } from '../cautions/context.ts';

const folder = mkdtempSync(join(tmpdir(), 'prices-'));
afterAll(() => rmSync(folder, { recursive: true }));

function pricesOf(text: string) {
  writeFileSync(join(folder, 'prices.yaml'), text);
  const { prices, problems } = readPrices(folder, REFERENCE);
  return { prices, rules: problems.map(({ rule, line }) => `${line} ${rule}`) };
}

const GOOD = `currency: XTS
prices:
  - { material: olive, per-kilogram: 6.43, on: 2026-11-02 }
  - { material: sodium-hydroxide, per-kilogram: 2, on: 2026-11-02 }
`;

describe('prices are read', () => {
  test('with their currency', () => {
    const { prices, rules } = pricesOf(GOOD);
    expect(rules).toEqual([]);
    expect(prices?.currency).toBe('XTS');
    expect(prices?.perKilogram.get('olive')).toBe(6.43);
  });

  test('by the pound of 453.592 37 g as well, in one way or the other', () => {
    const byPound = pricesOf(GOOD.replace('per-kilogram: 6.43', 'per-pound: 4.5359237'));
    expect(byPound.rules).toEqual([]);
    expect(byPound.prices?.perKilogram.get('olive')).toBeCloseTo(10, 9);
    const both = GOOD.replace('per-kilogram: 6.43', 'per-kilogram: 6.43, per-pound: 2');
    expect(pricesOf(both).rules).toEqual(['3 data/missing-key']);
  });

  test('or there are none', () => {
    expect(readPrices(join(folder, 'nowhere'), REFERENCE)).toEqual({ prices: null, problems: [] });
  });

  test.each([
    [GOOD.replace('material: olive', 'material: olvie'), ['3 data/unknown-word']],
    [GOOD.replace('sodium-hydroxide', 'olive'), ['4 data/repeated-entry']],
    [GOOD.replace('6.43', '-6.43'), ['3 data/out-of-range']],
    [GOOD.replace('2026-11-02', '2026-11-32'), ['3 data/date']],
    [GOOD.replace('XTS', 'euro'), ['1 data/text-form']],
  ])('and every mistake is told at its line', (text, expected) => {
    expect(pricesOf(text).rules).toEqual(expected);
  });
});

const formulas = [computedWith({ formula: { fats: [{ fat: 'olive', share: 100 }] } }).computed];

test('without being asked for, nothing of a price is in the data of the page', () => {
  const data = shoppingData({ reference: REFERENCE, formulas }, null);
  expect(data.prices).toBeNull();
  expect(JSON.stringify(data)).not.toMatch(/XTS|6\.43|currency|perKilogram/);
});

test('asked for, a batch of one kilogram of olive oil costs its oil and its alkali', () => {
  const { prices } = pricesOf(GOOD);
  const data = shoppingData({ reference: REFERENCE, formulas }, prices);
  const batch = data.batches[0];
  const alkali = data.materials.findIndex(({ id }) => id === 'sodium-hydroxide');
  const grams = batch?.lines.find(([material]) => material === alkali)?.[1] ?? 0;
  expect(grams).toBeGreaterThan(100);
  expect(costOf(data, batch?.lines ?? [])).toEqual({
    cost: expect.closeTo(6.43 + (2 * grams) / 1000, 10),
    unpriced: [],
  });
});

describe('in the finder', () => {
  const costIn = (text: string) =>
    finderData({ reference: REFERENCE, formulas }, pricesOf(text).prices).properties.find(
      ({ id }) => id === 'cost',
    );

  test('cost is a property where prices are handed in, by the kilogram of all that goes in', () => {
    const property = costIn(GOOD);
    const batch = formulas[0]?.document.batches[0];
    const alkali = batch?.alkali[0]?.weighedMass ?? 0;
    const olive = batch?.fats[0]?.weighedMass ?? 0;
    const whole = olive + alkali + (batch?.weighedWater ?? 0);
    expect(property?.unit).toBe('XTS/kg');
    // both prices are per kilogram, so grams over grams
    expect(property?.values).toEqual([expect.closeTo((6.43 * olive + 2 * alkali) / whole, 2)]);
  });

  test('a formula with a material that has no price has no number', () => {
    const text = GOOD.split('\n')
      .filter((line) => !line.includes('hydroxide'))
      .join('\n');
    expect(costIn(text)?.values).toEqual([null]);
  });

  test('without prices there is no such property, and no word of one', () => {
    const data = finderData({ reference: REFERENCE, formulas }, null);
    expect(JSON.stringify(data)).not.toMatch(/cost|XTS|kilogram of/i);
  });
});
