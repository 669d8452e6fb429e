import { describe, expect, test } from 'vitest';
import type { Formula } from '../../src/formulary/formula.ts';
import type { Formulary } from '../../src/formulary/formulary.ts';
import { allergensMet, makingOrder, nutSources } from '../../src/handbook/materials/allergens.ts';
import { makeableWithout, usesOfMaterial } from '../../src/handbook/materials/uses.ts';
import { computedWith, REFERENCE } from '../cautions/context.ts';

const made = (code: string, formula: Partial<Formula>) =>
  computedWith({ formula: { code, name: code, ...formula } }).computed;
const of = (...fats: readonly string[]) => ({
  fats: fats.map((fat) => ({ fat, share: 100 / fats.length })),
});
const MILK = { liquids: [{ liquid: 'goat-milk', replacesWater: 50, at: 'lye' as const }] };

const formulary: Formulary = {
  reference: REFERENCE,
  formulas: [
    made('A-NUT', of('almond', 'olive')),
    made('B-PLAIN', of('olive')),
    made('C-MILK', { ...of('olive'), ...MILK }),
    made('D-BOTH', { ...of('almond'), ...MILK }),
    made('E-PLAIN', of('coconut')),
  ],
};

describe('a making order', () => {
  const order = makingOrder(formulary);

  test('keeps allergens last', () => {
    expect(order.map(({ formulas }) => formulas.map(({ code }) => code))).toEqual([
      ['B-PLAIN', 'E-PLAIN'],
      ['C-MILK'],
      ['A-NUT'],
      ['D-BOTH'],
    ]);
  });

  test('asks for a clean-down where a step must not meet what was there, and nowhere else', () => {
    expect(order.map(({ cleanOf }) => cleanOf)).toEqual([[], [], ['milk'], []]);
  });

  test('holds every formula once', () => {
    const codes = order.flatMap(({ formulas }) => formulas.map(({ code }) => code));
    expect(codes.toSorted()).toEqual(formulary.formulas.map(({ document }) => document.code));
  });
});

test('what the equipment meets, with what brings it', () => {
  expect(allergensMet(formulary)).toEqual([
    { source: 'milk', materials: ['goat-milk'], codes: ['C-MILK', 'D-BOTH'] },
    { source: 'tree nuts', materials: ['almond'], codes: ['A-NUT', 'D-BOTH'] },
  ]);
  expect(nutSources(formulary)).toEqual(['Almond oil, sweet']);
});

describe('a material', () => {
  test('is used by share of the fats and by mass of each size', () => {
    const [first, second] = usesOfMaterial('almond', formulary);
    expect(first).toMatchObject({ code: 'A-NUT', percentOfFats: 50, afterCook: false });
    // the size of the tests is 1 kg of fats
    expect(first?.batches).toEqual([{ id: 'one', mass: 500 }]);
    expect(second?.batches).toEqual([{ id: 'one', mass: 1000 }]);
  });

  test('that runs out leaves the formulas without it', () => {
    expect(makeableWithout('olive', formulary).map(({ code }) => code)).toEqual([
      'D-BOTH',
      'E-PLAIN',
    ]);
    expect(makeableWithout('sodium-hydroxide', formulary)).toEqual([]);
  });
});
