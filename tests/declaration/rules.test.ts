import { describe, expect, test } from 'vitest';
import { massIn } from '../../src/chemistry/balance.ts';
import { grams } from '../../src/chemistry/quantity.ts';
import { loadFormulary } from '../../src/formulary/load.ts';
import { asAdded } from '../../src/handbook/declaration/as-added.ts';
import { asFormed } from '../../src/handbook/declaration/as-formed.ts';
import { declarationOf } from '../../src/handbook/declaration/declaration.ts';
import { declared, ingredient } from '../../src/handbook/declaration/ingredient.ts';
import type { AdditiveRecord } from '../../src/reference/material-records.ts';
import type { Reference } from '../../src/reference/reference.ts';
import type { ValueRecord } from '../../src/reference/values.ts';
import { batchSize, computedWith, type Wish } from '../cautions/context.ts';

const loaded = loadFormulary({ formulas: 'formulas', data: 'data' });
if (!loaded.ok) throw new Error('the demonstration has errors');
const { formulas, reference } = loaded.formulary;

describe.each(formulas.map((computed) => [computed.document.code, computed] as const))(
  'what is declared of %s weighs what is there',
  (_, computed) => {
    const sum = (list: readonly { readonly mass: number }[]) =>
      list.reduce((total, { mass }) => total + mass, 0);

    test('as added: all that goes in', () => {
      expect(sum(asAdded(computed.charge, reference))).toBeCloseTo(massIn(computed.charge), 6);
    });

    test('as formed: all that is released but the carbonate and the inert part of the alkali', () => {
      const { releasedMass, carbonateAndInert } = computed.document.yield;
      expect(sum(asFormed(computed, reference))).toBeCloseTo(releasedMass - carbonateAndInert, 6);
    });
  },
);

describe('order of a list', () => {
  const list = declared(
    [
      ingredient('B', 5),
      ingredient('A', 5),
      ingredient('Small', 0.6),
      ingredient('CI 1', 40, { colour: true, us: 'Colour' }),
      ingredient('Nothing', 0),
      ingredient('Small', 0.3),
      ingredient('Big', 49.1),
    ],
    'eu',
    100,
  );

  test('by mass, by name where masses are equal, small ones later, colours last, nothing left out twice', () => {
    expect(list.map(({ name, place }) => `${name} ${place}`)).toEqual([
      'Big descending',
      'A descending',
      'B descending',
      'Small under-one-percent',
      'CI 1 colour',
    ]);
  });

  test('equal names are added up before one percent is looked at', () => {
    const twice = declared(
      [ingredient('X', 0.6), ingredient('X', 0.5), ingredient('Y', 98.9)],
      'eu',
      100,
    );
    expect(twice[1]).toMatchObject({ name: 'X', place: 'descending' });
  });
});

const LAVENDER = 'essential-oil-lavender';
const content = (max: number): ValueRecord => ({
  value: null,
  min: null,
  max,
  unit: 'g/100 g',
  source: 'invented',
  at: 'a test',
  how: 'supplier',
  statistic: 'range',
  samples: null,
  temperature: null,
  note: null,
});

function withAllergens(reference: Reference, figures: Readonly<Record<string, number>>): Reference {
  const record = reference.additives.get(LAVENDER) as AdditiveRecord;
  const fragranceAllergens = Object.entries(figures).map(([name, max]) => ({
    name,
    content: content(max),
  }));
  const label = { ...record.label, fragranceAllergens };
  return {
    ...reference,
    additives: new Map([...reference.additives, [LAVENDER, { ...record, label }]]),
  };
}

describe('fragrance allergens', () => {
  const scented = (figures: Readonly<Record<string, number>>, percentOfFats: number) => {
    const { computed, reference: used } = computedWith({
      formula: { additives: [{ additive: LAVENDER, percentOfFats, at: 'trace' }] },
      // 20 g in 2000 g at release are 1 %
      document: (document) => ({ ...document, yield: { ...document.yield, releasedMass: 2000 } }),
      reference: (all) => withAllergens(all, figures),
    });
    return declarationOf(computed, used).fragrance;
  };

  test('one is named above 0.01 % of the soap and not at it: 1 % of an oil that holds 1.01 % or 1 %', () => {
    expect(scented({ Linalool: 1.01, Limonene: 1 }, 2)).toEqual({
      named: [{ name: 'Linalool', percent: expect.closeTo(0.0101, 10) }],
      unknown: [],
    });
  });

  test('figures that are all small leave nothing to name and nothing unknown', () => {
    expect(scented({ Linalool: 0.2 }, 2)).toEqual({ named: [], unknown: [] });
  });

  test('the largest share comes first', () => {
    expect(scented({ Coumarin: 5, Linalool: 35 }, 2).named.map(({ name }) => name)).toEqual([
      'Linalool',
      'Coumarin',
    ]);
  });
});

describe('claims', () => {
  const verdicts = (formula: Wish['formula']) => {
    const { computed, reference: used } = computedWith({ formula: formula ?? {} });
    const { claims } = declarationOf(computed, used);
    return Object.fromEntries(claims.map(({ claim, verdict }) => [claim, verdict]));
  };
  const only = (fat: string) => ({ fats: [{ fat, share: 100 }] });

  test.each([
    ['olive', { vegan: 'yes', 'palm-free': 'yes', 'nut-free': 'yes' }],
    ['lard', { vegan: 'no', 'palm-free': 'yes', 'nut-free': 'yes' }],
    ['palm-kernel', { vegan: 'yes', 'palm-free': 'no', 'nut-free': 'yes' }],
    ['almond', { vegan: 'yes', 'palm-free': 'yes', 'nut-free': 'no' }],
    ['groundnut', { vegan: 'yes', 'palm-free': 'yes', 'nut-free': 'no' }],
  ])('of %s', (fat, expected) => expect(verdicts(only(fat))).toEqual(expected));

  test('glycerol may come from palm: not claimed', () => {
    const formula = {
      ...only('olive'),
      additives: [{ additive: 'glycerol', percentOfFats: 5, at: 'trace' as const }],
    };
    expect(verdicts(formula)).toEqual({ vegan: 'yes', 'palm-free': 'open', 'nut-free': 'yes' });
  });

  test('a perfume of unknown make leaves every claim open', () => {
    const formula = {
      ...only('olive'),
      additives: [{ additive: 'fragrance-quayside', percentOfFats: 1, at: 'trace' as const }],
    };
    expect(verdicts(formula)).toEqual({ vegan: 'open', 'palm-free': 'open', 'nut-free': 'open' });
  });

  test('the fat inside a milk counts', () => {
    const formula = {
      ...only('olive'),
      liquids: [{ liquid: 'goat-milk', replacesWater: 50, at: 'lye' as const }],
    };
    expect(verdicts(formula).vegan).toBe('no');
  });
});

test('a fat without a name of its soap leaves a gap that is marked, never a made-up name', () => {
  const { computed, reference: used } = computedWith({
    formula: { fats: [{ fat: 'neem', share: 100 }] },
  });
  const { formed } = declarationOf(computed, used);
  expect(formed.eu[0]).toMatchObject({
    nameless: true,
    name: expect.stringMatching(/no INCI name/),
  });
  expect(formed.eu.filter(({ nameless }) => nameless)).toHaveLength(1);
});

// 118 g of which 20 g of 100 g is water, dried to 10 g in 90: 118 x 0.8/0.9
test('net mass of a bar is the poured mass less the water that goes; an ounce is 28.349523125 g', () => {
  const { computed, reference: used } = computedWith({
    reference: (all) => ({
      ...all,
      shop: {
        ...all.shop,
        batches: [batchSize({ size: { by: 'bars', count: 10, wetMass: grams(118) } })],
      },
    }),
    document: (document) => ({
      ...document,
      yield: { ...document.yield, total: 90, releasedMass: 80 },
    }),
  });
  const [one] = declarationOf(computed, used).netMasses;
  expect(one?.released).toBeCloseTo(104.8889, 4);
  expect(one?.ounces).toBeCloseTo(3.6998, 4);
});
