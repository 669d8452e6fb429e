import { alkaliPerMole } from '../../chemistry/alkali.ts';
import type { Working } from './context.ts';
import { type Section, type Step, step } from './step.ts';
import { exact, figure, fractionOf, minus, product, sumOf, symbol } from './term.ts';

/** The water rule, what liquids and stock lye bring, and what is left to add. */
export function water(working: Working): Section {
  const { charge, equivalents, reference } = working;
  const { water: rule, liquids, holdBack } = charge.formulation;
  const perMole = alkaliPerMole(charge.formulation, reference.constants);
  const ruled = perMole.ruled * equivalents.hydroxide;
  const fats = charge.fats.reduce((sum, { mass }) => sum + mass, 0);
  const [equation, numbers, total] =
    rule.form === 'lye-concentration'
      ? [
          product(symbol('m', 'alkali'), fractionOf(minus(exact(1), symbol('c')), symbol('c'))),
          product(
            figure(ruled, toMilligram(ruled)),
            fractionOf(minus(exact(1), exact(rule.value)), exact(rule.value)),
          ),
          (ruled * (1 - rule.value)) / rule.value,
        ]
      : rule.form === 'per-alkali'
        ? [
            product(symbol('r'), symbol('m', 'alkali')),
            product(exact(rule.value), figure(ruled, toMilligram(ruled))),
            ruled * rule.value,
          ]
        : [
            product(symbol('p'), symbol('m', 'fats')),
            product(exact(rule.value), figure(fats, toMilligram(fats))),
            fats * rule.value,
          ];
  const steps = [
    step({
      kind: 'water-total',
      symbol: symbol('W'),
      equation,
      numbers,
      value: total,
      digits: toMilligram(total),
      unit: 'g',
    }),
  ];
  let left = figure(total, toMilligram(total));
  const takeAway = (kind: 'water-from-liquids' | 'water-in-stock', part: Step) => {
    steps.push({ ...part, kind });
    left = minus(left, part.result);
  };
  const inLiquids = charge.liquids.reduce((sum, { liquid, mass }) => sum + mass * liquid.water, 0);
  if (liquids.length > 0) {
    takeAway(
      'water-from-liquids',
      step({
        kind: 'water-from-liquids',
        symbol: symbol('W', 'liquids'),
        equation: product(symbol('m'), symbol('w')),
        numbers: sumOf(
          ...charge.liquids.map(({ liquid, mass }) =>
            product(figure(mass, toMilligram(mass)), exact(liquid.water)),
          ),
        ),
        value: inLiquids,
        digits: toMilligram(inLiquids),
        unit: 'g',
      }),
    );
  }
  const stock = perMole.stockWater * equivalents.hydroxide;
  if (stock > 0) {
    const solutions = charge.alkali.filter(({ supply }) => supply.form === 'solution');
    takeAway(
      'water-in-stock',
      step({
        kind: 'water-in-stock',
        symbol: symbol('W', 'stock'),
        equation: minus(symbol('m', 'weighed'), symbol('m', 'pure')),
        numbers: sumOf(
          ...solutions.map(({ weighedMass, pureMass }) =>
            minus(
              figure(weighedMass, toMilligram(weighedMass)),
              figure(pureMass, toMilligram(pureMass)),
            ),
          ),
        ),
        value: stock,
        digits: toMilligram(stock),
        unit: 'g',
      }),
    );
  }
  steps.push(
    step({
      kind: 'water',
      symbol: symbol('m', 'water'),
      numbers: left,
      value: charge.water,
      unit: 'g',
      within: 0.002,
    }),
  );
  if (holdBack > 0) {
    steps.push(
      step({
        kind: 'held-back',
        symbol: symbol('m', 'held'),
        numbers: product(figure(charge.water), exact(holdBack)),
        value: charge.heldBack,
        unit: 'g',
      }),
    );
  }
  return { id: 'water', subject: null, steps };
}

/** Digits that print grams to the milligram at least: what is left may be a small difference of large masses. */
const toMilligram = (mass: number): number => Math.max(6, 4 + Math.floor(Math.log10(mass || 1)));
