import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { massBalance, massIn } from '../../src/chemistry/balance.ts';
import { fatWeighings } from '../../src/chemistry/blend.ts';
import type { Formulation } from '../../src/chemistry/charge.ts';
import { superfatMargin } from '../../src/chemistry/margin.ts';
import { fraction, grams } from '../../src/chemistry/quantity.ts';
import { reckon } from '../../src/chemistry/reckon.ts';
import { AS_USED, equivalentsOf, superfatFrom } from '../../src/chemistry/superfat.ts';
import { weigh } from '../../src/chemistry/weigh.ts';
import { anyFormulation } from '../support/arbitraries.ts';
import { CONSTANTS, fat, formulation } from '../support/materials.ts';
import { givenValue } from '../support/outcome.ts';

const OLIVE = fat('olive', { value: 190, low: 184, high: 196 });
const COCONUT = fat('coconut', { value: 257, low: 248, high: 265 });
const SHEA = fat('shea', { value: 179, low: 170, high: 190 });

/** Half of the fats from a blend of 60 % coconut and 40 % shea; more coconut is weighed by itself. */
const BLENDED = formulation({
  fats: [
    { fat: OLIVE, share: fraction(0.4) },
    { fat: COCONUT, share: fraction(0.3), blend: 'base' },
    { fat: SHEA, share: fraction(0.2), blend: 'base' },
    { fat: COCONUT, share: fraction(0.1) },
  ],
});
const WRITTEN_OUT = formulation({
  fats: [
    { fat: OLIVE, share: fraction(0.4) },
    { fat: COCONUT, share: fraction(0.4) },
    { fat: SHEA, share: fraction(0.2) },
  ],
});
const charge = (wish: Formulation, mass = 1000) => givenValue(reckon(wish, grams(mass), CONSTANTS));
const scale =
  (step: number, error = 0) =>
  () => ({ step: grams(step), error: grams(error) });

describe('a blend counts as its parts', () => {
  const [blended, written] = [charge(BLENDED), charge(WRITTEN_OUT)];

  test('the same alkali and water', () => {
    expect(blended.alkali[0]?.weighedMass).toBeCloseTo(written.alkali[0]?.weighedMass ?? 0, 10);
    expect(blended.water).toBeCloseTo(written.water, 10);
  });

  test('the same margin and budget: a fat that stands there twice errs as one', () => {
    const [a, b] = [
      givenValue(superfatMargin(blended, CONSTANTS)),
      givenValue(superfatMargin(written, CONSTANTS)),
    ];
    expect(a.expanded.low).toBeCloseTo(b.expanded.low, 12);
    expect(a.expanded.high).toBeCloseTo(b.expanded.high, 12);
    expect(a.worstCase.low).toBeCloseTo(b.worstCase.low, 12);
    expect(a.budget.map(({ id }) => id)).toEqual(b.budget.map(({ id }) => id));
  });

  test('for any formulation, with any two fats taken as a blend', () => {
    fc.assert(
      fc.property(anyFormulation, (wish) => {
        const fats = wish.fats.map((line, i) => (i < 2 ? { ...line, blend: 'base' } : line));
        const [one, other] = [charge(wish), charge({ ...wish, fats })];
        expect(other.alkali.map(({ weighedMass }) => weighedMass)).toEqual(
          one.alkali.map(({ weighedMass }) => weighedMass),
        );
        const balance = massBalance(other, CONSTANTS);
        expect(Math.abs(balance.total / massIn(other) - 1)).toBeLessThan(1e-9);
        expect(balance).toEqual(massBalance(one, CONSTANTS));
      }),
    );
  });
});

describe('a blend is weighed as one', () => {
  test('its weight is rounded, not those of its parts', () => {
    // 503 g of fats: 251.5 g of blend is 252 on a 1 g scale; parts by themselves would be 151 and 101
    const weighed = givenValue(weigh(charge(BLENDED, 503), scale(1), 1, CONSTANTS));
    expect(fatWeighings(weighed.charge.fats)).toMatchObject([
      { id: 'olive', mass: 201 },
      { id: 'base', mass: 252, lines: [1, 2] },
      { id: 'coconut', mass: 50 },
    ]);
    const [, coconut, shea] = weighed.charge.fats;
    expect(coconut?.mass).toBeCloseTo(252 * 0.6, 9);
    expect(shea?.mass).toBeCloseTo(252 * 0.4, 9);
  });

  test('the superfat of the weights counts the parts and is not below the one written', () => {
    fc.assert(
      fc.property(anyFormulation, fc.constantFrom(0.1, 1, 5), (wish, step) => {
        const fats = wish.fats.map((line, i) => (i < 3 ? { ...line, blend: 'base' } : line));
        const weighed = weigh(charge({ ...wish, fats }), scale(step), 1, CONSTANTS);
        if (!weighed.ok) return;
        const { charge: rounded, superfat } = weighed.value;
        expect(superfat).toBeGreaterThanOrEqual(wish.superfat - 1e-9);
        expect(superfatFrom(equivalentsOf(rounded, AS_USED, CONSTANTS))).toBeCloseTo(superfat, 12);
        for (const { mass } of fatWeighings(rounded.fats)) {
          expect(Math.abs(mass / step - Math.round(mass / step))).toBeLessThan(1e-6);
        }
      }),
    );
  });

  test('one error of the scale, shared by its parts as one', () => {
    const weighed = givenValue(weigh(charge(BLENDED), scale(1, 0.5), 1, CONSTANTS)).weighing;
    // half a step and the scale's own error: 1 g, of which 60 % falls on coconut
    expect(weighed.fats).toEqual([1, expect.closeTo(0.6, 12), expect.closeTo(0.4, 12), 1]);
    const certain = (id: string, value: number) => fat(id, { value });
    const blendOf = (blend?: string) =>
      formulation({
        fats: [
          { fat: certain('a', 190), share: fraction(0.5), ...(blend && { blend }) },
          { fat: certain('b', 190), share: fraction(0.5), ...(blend && { blend }) },
        ],
      });
    const half = (wish: Formulation) => {
      const { charge: rounded, weighing } = givenValue(
        weigh(charge(wish), scale(1, 1), 1, CONSTANTS),
      );
      const onlyFats = { ...weighing, alkali: [0] };
      return givenValue(superfatMargin(rounded, CONSTANTS, onlyFats)).budget.find(
        ({ id }) => id === 'scale',
      )?.halfWidth;
    };
    // two weighings of equal effect are sqrt 2 of one
    const [together = 0, apart = 0] = [half(blendOf('base')), half(blendOf())];
    expect(apart / together).toBeCloseTo(Math.SQRT2, 9);
  });
});
