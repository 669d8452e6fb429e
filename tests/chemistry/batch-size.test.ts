import { describe, expect, test } from 'vitest';
import { massIn } from '../../src/chemistry/balance.ts';
import { batterDensity, massOfFatsFor } from '../../src/chemistry/batch-size.ts';
import { dilutionWater } from '../../src/chemistry/dilution.ts';
import { fraction, grams } from '../../src/chemistry/quantity.ts';
import { reckon } from '../../src/chemistry/reckon.ts';
import { CONSTANTS, fat, formulation } from '../support/materials.ts';
import { givenValue } from '../support/outcome.ts';

const DENSITY = {
  // CRC, 20 degC, from memory
  Na: [
    [30, 1.3277],
    [40, 1.4299],
  ],
  K: [],
} as const;
const charge = givenValue(reckon(formulation(), grams(1000), CONSTANTS));
const batter = massIn(charge);

describe('batch size', () => {
  test('by fats is taken as it is, losses or not', () => {
    const size = { by: 'fats', mass: grams(750) } as const;
    expect(givenValue(massOfFatsFor(size, charge, 0.1, DENSITY))).toBe(750);
  });

  test('by batter and by bars makes what reaches the mould', () => {
    const made = givenValue(
      massOfFatsFor({ by: 'bars', count: 48, wetMass: grams(120) }, charge, 0.02, DENSITY),
    );
    expect((made / 1000) * batter * 0.98).toBeCloseTo(48 * 120, 6);
    const same = massOfFatsFor({ by: 'batter', mass: grams(5760) }, charge, 0.02, DENSITY);
    expect(givenValue(same)).toBeCloseTo(made, 9);
  });

  test('by mould volume adds the volumes of fats and lye', () => {
    // by hand: 1000 / 0.91 = 1098.9 mL; lye 389.93 g of 33 % at 1.35836: 287.06 mL; 1389.93 / 1385.96
    expect(givenValue(batterDensity(charge, DENSITY))).toBeCloseTo(1389.93 / 1385.96, 4);
    const fats = givenValue(massOfFatsFor({ by: 'mould', millilitres: 1000 }, charge, 0, DENSITY));
    expect((fats / 1000) * batter).toBeCloseTo(1002.86, 1);
  });

  test('gives no estimate without densities, and no size with impossible losses', () => {
    const unknown = givenValue(
      reckon(
        formulation({
          fats: [{ fat: fat('x', { value: 190, density: null }), share: fraction(1) }],
        }),
        grams(1000),
        CONSTANTS,
      ),
    );
    expect(batterDensity(unknown, DENSITY)).toMatchObject({
      breach: { rule: 'fat-density-not-known' },
    });
    const weak = formulation({ water: { form: 'lye-concentration', value: fraction(0.2) } });
    expect(batterDensity(givenValue(reckon(weak, grams(1000), CONSTANTS)), DENSITY)).toMatchObject({
      breach: { rule: 'lye-density-out-of-range' },
    });
    expect(massOfFatsFor({ by: 'batter', mass: grams(1) }, charge, 0.6, DENSITY)).toMatchObject({
      breach: { rule: 'losses-out-of-range' },
    });
  });
});

describe('dilution', () => {
  test('a kilogram of 60 % paste to 20 % takes two kilograms of water', () => {
    expect(givenValue(dilutionWater(grams(1000), fraction(0.6), fraction(0.2)))).toBeCloseTo(
      2000,
      9,
    );
  });
  test('never makes a paste stronger', () => {
    expect(dilutionWater(grams(1000), fraction(0.2), fraction(0.3))).toMatchObject({
      breach: { rule: 'dilution-not-weaker' },
    });
  });
});
