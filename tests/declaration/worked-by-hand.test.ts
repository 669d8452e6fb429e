import { describe, expect, test } from 'vitest';
import { declarationOf } from '../../src/handbook/declaration/declaration.ts';
import type { DeclaredIngredient } from '../../src/handbook/declaration/ingredient.ts';
import { computedWith } from '../cautions/context.ts';

// Worked by hand for 1000 g of fats with a calculator, from the values written beside each step; molar masses by
// the abridged standard atomic weights: NaOH 39.997, KOH 56.105, glycerol 92.094, C3H2 of a glycerol residue
// 38.049, water 18.015, Na 22.990, K 39.098, H 1.008. Lots of the tests: sodium hydroxide 98.5 %, potassium 89.5 %.

const shares = (list: readonly DeclaredIngredient[]) =>
  Object.fromEntries(list.map(({ name, percent }) => [name, percent]));
const names = (list: readonly DeclaredIngredient[]) => list.map(({ name }) => name);

function expectShares(
  list: readonly DeclaredIngredient[],
  byHand: Readonly<Record<string, number>>,
) {
  expect(names(list)).toEqual(Object.keys(byHand));
  for (const [name, percent] of Object.entries(byHand)) {
    expect(Math.abs((shares(list)[name] ?? 0) - percent), name).toBeLessThan(0.01);
  }
}

describe('olive oil alone, 5 % superfat, lye of one part to two of water, dried to 12 %', () => {
  const { computed, reference } = computedWith({
    formula: {
      fats: [{ fat: 'olive', share: 100 }],
      superfat: 5,
      water: { form: 'per-alkali', value: 2, holdBack: 0 },
      release: { freeAlkali: null, ph: null, moisture: 12 },
    },
  });
  const { added, formed, claims, netMasses } = declarationOf(computed, reference);

  // SV 190: 190/56105 = 3.386507 mmol/g; 95 % of 3.386507 mol = 3.217182 mol; x 39.997 = 128.6776 g pure,
  // /0.985 = 130.6372 g; water 261.2744 g; together 1391.9116 g
  test('as added', () => {
    expectShares(added.eu, {
      'Olea Europaea Fruit Oil': 71.8437,
      Aqua: 18.7709,
      'Sodium Hydroxide': 9.3854,
    });
    expect(names(added.us)).toEqual(['Olea Europaea Fruit Oil', 'Water', 'Sodium Hydroxide']);
  });

  // unsaponifiable 7.5 g; 992.5/3.386507 = 293.0748 g per mol of ester, less 38.049/3 = 280.3918 as acid, with
  // 22.990 - 1.008 = 302.3738 as soap; x 3.217182 = 972.7915 g. Glycerol 3.217182/3 x 92.094 = 98.7611 g.
  // Left: 5 % of 992.5 = 49.625 and 7.5 = 57.125 g. Inert of the alkali 1.5 % of 130.6372 = 1.9596 g.
  // Dry 1130.6372 g; /0.88 = 1284.8150 g released, 154.1778 g of it water.
  test('as formed', () => {
    expectShares(formed.eu, {
      'Sodium Olivate': 75.7145,
      Aqua: 12,
      Glycerin: 7.6868,
      'Olea Europaea Fruit Oil': 4.4462,
    });
  });

  test('claims follow the data, and a size by mass has no net mass of a bar', () => {
    expect(claims.map(({ verdict }) => verdict)).toEqual(['yes', 'yes', 'yes']);
    expect(netMasses).toEqual([]);
  });
});

describe('a paste of coconut and castor oil, 60 parts of potassium to 40 of sodium by amount', () => {
  const { computed, reference } = computedWith({
    formula: {
      kind: 'paste',
      process: 'hot',
      fats: [
        { fat: 'coconut', share: 50 },
        { fat: 'castor', share: 50 },
      ],
      alkali: { sodium: 40, potassium: 60, basis: 'moles' },
      superfat: 2,
      water: { form: 'per-alkali', value: 2, holdBack: 0 },
    },
  });
  const { added, formed } = declarationOf(computed, reference);

  // Coconut 256.5 and castor 181 mg/g: 500 x (256.5 + 181)/56105 = 3.898940 mol; 98 % = 3.820961 mol.
  // KOH 0.6 x 3.820961 x 56.105/0.895 = 143.7141 g; NaOH 0.4 x 3.820961 x 39.997/0.985 = 62.0608 g; water
  // 411.5498 g; together 1617.3247 g
  test('as added: equal masses stand by name', () => {
    expectShares(added.eu, {
      'Cocos Nucifera Oil': 30.9152,
      'Ricinus Communis Seed Oil': 30.9152,
      Aqua: 25.4463,
      'Potassium Hydroxide': 8.8859,
      'Sodium Hydroxide': 3.8372,
    });
  });

  // Coconut: 2.285892 mol of ester in 496.25 g, 98 % = 2.240174 mol reacts; acid 496.25/2.285892 - 12.683 =
  // 204.4109; potassium soap 0.6 x 2.240174 x (204.4109 + 38.090) = 325.9472, sodium soap 0.4 x 2.240174 x
  // (204.4109 + 21.982) = 202.8630. Castor: 1.613047 mol in 498 g, 1.580786 mol; acid 296.0496; 0.6 x 1.580786 x
  // 334.1396 = 316.9214, 0.4 x 1.580786 x 318.0316 = 201.0953. Glycerol 3.820961/3 x 92.094 = 117.2960. Left:
  // coconut 9.925 + 3.75 = 13.675, castor 9.96 + 2 = 11.96. Not dried. Of the potassium
  // hydroxide 9.9 % of 143.7141 g is water (89.5 hydroxide, 0.6 carbonate): 14.2277 g; water 425.7775 g of 1617.3247 g
  test('as formed: each fat gives two soaps', () => {
    expectShares(formed.eu, {
      Aqua: 26.326,
      'Potassium Cocoate': 20.1535,
      'Potassium Castorate': 19.5954,
      'Sodium Cocoate': 12.5431,
      'Sodium Castorate': 12.4338,
      Glycerin: 7.2525,
      'Cocos Nucifera Oil': 0.8455,
      'Ricinus Communis Seed Oil': 0.7395,
    });
    expect(formed.eu.map(({ place }) => place).slice(-2)).toEqual([
      'under-one-percent',
      'under-one-percent',
    ]);
  });
});

describe('tallow with citric acid, clay, lavender oil and charcoal', () => {
  const { computed, reference } = computedWith({
    formula: {
      fats: [{ fat: 'tallow', share: 100 }],
      superfat: 5,
      water: { form: 'per-alkali', value: 2, holdBack: 0 },
      additives: [
        { additive: 'citric-acid-monohydrate', percentOfFats: 2, at: 'lye' },
        { additive: 'kaolin', percentOfFats: 3, at: 'trace' },
        { additive: 'essential-oil-lavender', percentOfFats: 2, at: 'trace' },
        { additive: 'activated-charcoal', percentOfFats: 1.5, at: 'trace' },
      ],
      release: { freeAlkali: null, ph: null, moisture: 12 },
    },
  });
  const { added, formed, fragrance, claims } = declarationOf(computed, reference);

  // Tallow 196 mg/g: 3.493450 mol, 95 % = 3.318777 mol for it; citric acid monohydrate 210.138: 20 g = 0.0951756
  // mol, three protons 0.2855267 mol; 3.604304 mol x 39.997/0.985 = 146.3561 g; water 292.7122 g;
  // together 1000 + 146.3561 + 292.7122 + 20 + 30 + 20 + 15 = 1524.0683 g
  test('as added: scents stand as perfume, colours last', () => {
    expectShares(added.eu, {
      'Adeps Bovis': 65.6139,
      Aqua: 19.206,
      'Sodium Hydroxide': 9.603,
      Kaolin: 1.9684,
      'Citric Acid': 1.3123,
      Parfum: 1.3123,
      'Charcoal Powder': 0.9842,
    });
    expect(names(added.us)).toEqual([
      'Tallow',
      'Water',
      'Sodium Hydroxide',
      'Kaolin',
      'Citric Acid',
      'Fragrance',
      'Charcoal Powder',
    ]);
    expect(added.eu.at(-1)?.place).toBe('colour');
  });

  // 994/3.493450 = 284.5325 - 12.683 = 271.8495 as acid, 293.8315 as soap x 3.318777 = 975.1613 g; glycerol
  // 3.318777/3 x 92.094 = 101.8799; left 49.7 + 6 = 55.7 g. Citrate: the acid without its water 20 x 192.123/210.138
  // = 18.2854 and 0.2855267 x 21.982 = 6.2764: 24.5618 g. Inert 1.5 % of 146.3561 = 2.1953. Dry: 975.1613 +
  // 101.8799 + 55.7 + 24.5618 + 2.1953 + 30 + 20 + 15 = 1224.4983; /0.88 = 1391.4754 g
  test('as formed: the acid stands as its salt', () => {
    expectShares(formed.eu, {
      'Sodium Tallowate': 70.0811,
      Aqua: 12,
      Glycerin: 7.3217,
      'Adeps Bovis': 4.0029,
      Kaolin: 2.156,
      'Sodium Citrate': 1.7652,
      Parfum: 1.4373,
      'Charcoal Powder': 1.078,
    });
  });

  test('without figures of the supplier the fragrance is named as unknown', () => {
    expect(fragrance).toEqual({ named: [], unknown: ['Essential oil, lavender'] });
  });

  test('tallow speaks against vegan, nothing against the rest', () => {
    expect(claims).toEqual([
      { claim: 'vegan', verdict: 'no', because: [expect.stringMatching(/tallow/i)] },
      { claim: 'palm-free', verdict: 'yes', because: [] },
      { claim: 'nut-free', verdict: 'yes', because: [] },
    ]);
  });
});
