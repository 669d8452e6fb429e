import { describe, expect, test } from 'vitest';
import type { Formulation } from '../../src/chemistry/charge.ts';
import { lyeOf } from '../../src/chemistry/lye.ts';
import { fraction, grams, molesPerGram } from '../../src/chemistry/quantity.ts';
import { reckon } from '../../src/chemistry/reckon.ts';
import { finalSuperfat } from '../../src/chemistry/superfat.ts';
import {
  alkali,
  CITRIC_MONOHYDRATE,
  CONSTANTS,
  fat,
  formulation,
  MILK,
} from '../support/materials.ts';
import { givenValue } from '../support/outcome.ts';

const at1000 = (wish: Partial<Formulation>) =>
  givenValue(reckon(formulation(wish), grams(1000), CONSTANTS));
const naoh = at1000({}).alkali[0]?.weighedMass ?? Number.NaN;

describe('alkali', () => {
  // by hand: 190 / 56.105 x 0.95 = 3.21718 mol; x 39.997 = 128.677 g, x 56.105 = 180.5 g
  test('sodium and potassium by hand', () => {
    expect(naoh).toBeCloseTo(128.68, 2);
    const potash = at1000({ alkali: [{ supply: alkali('K', 1), share: fraction(1) }] });
    expect(potash.alkali[0]?.weighedMass).toBeCloseTo(180.5, 6);
  });

  test('an assay of 90 % takes a ninth more', () => {
    const charge = at1000({ alkali: [{ supply: alkali('K', 0.9), share: fraction(1) }] });
    expect(charge.alkali[0]?.weighedMass).toBeCloseTo(180.5 / 0.9, 6);
  });

  const mixed = (basis: 'moles' | 'mass') =>
    at1000({
      basis,
      alkali: [
        { supply: alkali('Na', 1), share: fraction(0.4) },
        { supply: alkali('K', 1), share: fraction(0.6) },
      ],
    }).alkali;

  test('mixed lye by amount: 40 : 60 in moles', () => {
    const [na, k] = mixed('moles');
    expect(na?.moles).toBeCloseTo(0.4 * 3.21718, 4);
    expect(k?.moles).toBeCloseTo(0.6 * 3.21718, 4);
  });

  test('mixed lye by mass: 40 : 60 in pure grams', () => {
    const [na, k] = mixed('mass');
    expect((na?.pureMass ?? 0) / (k?.pureMass ?? 1)).toBeCloseTo(2 / 3, 9);
    expect((na?.moles ?? 0) + (k?.moles ?? 0)).toBeCloseTo(3.21718, 4);
  });
});

describe('water', () => {
  test('by lye concentration, alkali as weighed', () => {
    const charge = at1000({
      alkali: [{ supply: alkali('Na', 0.98), share: fraction(1) }],
      water: { form: 'lye-concentration', value: fraction(0.32) },
    });
    const weighed = charge.alkali[0]?.weighedMass ?? 0;
    expect(weighed / (weighed + charge.water)).toBeCloseTo(0.32, 12);
    expect(lyeOf(charge).concentration).toBeCloseTo(0.32, 12);
  });

  test('per alkali and as percent of the fats', () => {
    expect(at1000({ water: { form: 'per-alkali', value: 2.1 } }).water).toBeCloseTo(2.1 * naoh, 9);
    const byFats = at1000({ water: { form: 'percent-of-fats', value: fraction(0.33) } });
    expect(byFats.water).toBeCloseTo(330, 9);
  });

  test('stock lye: extra water, counted on the dissolved hydroxide', () => {
    const charge = at1000({
      alkali: [{ supply: alkali('Na', 0.5, { form: 'solution' }), share: fraction(1) }],
      water: { form: 'lye-concentration', value: fraction(0.32) },
    });
    expect(charge.alkali[0]?.weighedMass).toBeCloseTo(2 * naoh, 6);
    // the whole lye weighs naoh / 0.32, of which the stock is 2 naoh
    expect(charge.water).toBeCloseTo(naoh / 0.32 - 2 * naoh, 6);
    expect(lyeOf(charge).concentration).toBeCloseTo(0.32, 12);
  });

  test('a stock weaker than the lye is refused, one just as strong needs no water', () => {
    const stock = (concentration: number) =>
      reckon(
        formulation({
          alkali: [{ supply: alkali('Na', 0.3, { form: 'solution' }), share: fraction(1) }],
          water: { form: 'lye-concentration', value: fraction(concentration) },
        }),
        grams(1000),
        CONSTANTS,
      );
    expect(stock(0.33)).toMatchObject({ ok: false, breach: { rule: 'stock-weaker-than-lye' } });
    expect(givenValue(stock(0.3)).water).toBeCloseTo(0, 9);
  });

  test('held-back water leaves a stronger lye in the pot', () => {
    const charge = at1000({
      water: { form: 'lye-concentration', value: fraction(0.3) },
      holdBack: fraction(0.2),
    });
    expect(charge.heldBack).toBeCloseTo(0.2 * charge.water, 9);
    expect(lyeOf(charge).asMade).toBeCloseTo(naoh / (naoh + 0.8 * charge.water), 9);
  });
});

describe('liquids', () => {
  test('bring water, and fat that takes alkali of its own', () => {
    const charge = at1000({
      water: { form: 'percent-of-fats', value: fraction(0.33) },
      liquids: [{ liquid: MILK, replacesWater: fraction(0.5), at: 'lye' }],
    });
    const milk = charge.liquids[0]?.mass ?? 0;
    expect(milk * 0.87).toBeCloseTo(165, 9);
    expect(charge.water).toBeCloseTo(165, 9);
    // by hand: 189.66 g of milk, 7.586 g of fat at 226: 0.03056 mol x 0.95 x 39.997 = 1.161 g
    expect((charge.alkali[0]?.weighedMass ?? 0) - naoh).toBeCloseTo(1.161, 3);
  });

  test('that bring acid take alkali for it, which takes water in turn', () => {
    const vinegar = {
      ...MILK,
      fat: fraction(0),
      fatData: null,
      water: fraction(0.95),
      acidity: molesPerGram(0.05 / 60.052),
    };
    const charge = at1000({
      liquids: [{ liquid: vinegar, replacesWater: fraction(1), at: 'lye' }],
    });
    const acid = (charge.liquids[0]?.mass ?? 0) * vinegar.acidity;
    expect(charge.alkali[0]?.moles).toBeCloseTo(3.21718 + acid, 4);
    expect(lyeOf(charge).concentration).toBeCloseTo(0.33, 12);
  });

  test('more acid than their water can carry is refused', () => {
    const strong = { ...MILK, fatData: null, water: fraction(0.2), acidity: molesPerGram(0.013) };
    expect(
      reckon(
        formulation({ liquids: [{ liquid: strong, replacesWater: fraction(1), at: 'lye' }] }),
        grams(1000),
        CONSTANTS,
      ),
    ).toMatchObject({
      ok: false,
      breach: { rule: 'liquids-need-more-alkali-than-they-leave-water-for' },
    });
  });
});

describe('what joins after saponification', () => {
  test('after-cook fats raise the final superfat, by equivalents', () => {
    const charge = at1000({
      process: 'hot',
      afterCookFats: [{ fat: fat('sunflower', { value: 190 }), perFats: fraction(0.03) }],
    });
    expect(charge.alkali[0]?.weighedMass).toBeCloseTo(naoh, 9);
    expect(finalSuperfat(charge, CONSTANTS)).toBeCloseTo(1 - 0.95 / 1.03, 9);
  });

  test('acid at dilution gets no alkali and frees fatty acid', () => {
    const charge = at1000({
      additives: [{ additive: CITRIC_MONOHYDRATE, perFats: fraction(0.01), at: 'dilution' }],
    });
    expect(charge.alkali[0]?.weighedMass).toBeCloseTo(naoh, 9);
    // 10 g of citric acid: 0.14276 mol of 3.38651
    expect(finalSuperfat(charge, CONSTANTS)).toBeCloseTo(0.05 + 0.14276 / 3.38651, 4);
  });
});
