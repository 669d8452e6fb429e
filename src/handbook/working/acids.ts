import { isBeforeSaponification } from '../../chemistry/saponification.ts';
import { cited, named, type Working } from './context.ts';
import { molarMassOf } from './molar-masses.ts';
import { type Section, type Step, step } from './step.ts';
import { exact, figure, fractionOf, minus, product, sumOf, symbol } from './term.ts';

/** Acid protons that are there before saponification. `null` where there are none. */
export function acids(working: Working): Section | null {
  const { charge, reference } = working;
  const steps = charge.additives.flatMap(({ additive, mass, at }): Step[] => {
    if (additive.acidity === 0 || !isBeforeSaponification(at)) return [];
    const record = reference.additives.get(additive.id);
    const content = record?.values.find(({ name }) => name === 'content');
    const substance = record?.substance;
    const formulaMass = substance
      ? molarMassOf(substance.formula, working) +
        (substance.crystalWater ?? 0) * reference.constants.water
      : 1;
    const protons = substance?.protons ?? 1;
    return [
      step({
        kind: 'acid-of',
        of: additive.id,
        subject: named(working, additive.id),
        symbol: symbol('n', 'acid'),
        equation: fractionOf(product(symbol('z'), symbol('m'), symbol('w')), symbol('M')),
        numbers: fractionOf(
          product(exact(protons), figure(mass), figure((additive.acidity * formulaMass) / protons)),
          figure(formulaMass, 8),
        ),
        value: mass * additive.acidity,
        unit: 'mol',
        sources: content ? [cited(reference, content)] : [],
      }),
    ];
  });
  for (const { liquid, mass, at } of charge.liquids) {
    if (liquid.acidity === 0 || !isBeforeSaponification(at)) continue;
    steps.push(
      step({
        kind: 'acid-of',
        of: liquid.id,
        subject: named(working, liquid.id),
        symbol: symbol('n', 'acid'),
        numbers: product(figure(mass), figure(liquid.acidity)),
        value: mass * liquid.acidity,
        unit: 'mol',
      }),
    );
  }
  if (steps.length === 0) return null;
  const total = step({
    kind: 'acid',
    symbol: symbol('n', 'acid'),
    numbers: sumOf(...steps.map(({ result }) => result)),
    value: working.equivalents.acid,
    unit: 'mol',
  });
  return { id: 'acids', subject: null, steps: [...steps, total] };
}

/** n(OH) = E (1 - s) + n(acid). */
export function hydroxide(working: Working): Section {
  const { equivalents, charge } = working;
  const superfat = charge.formulation.superfat;
  const kept = product(figure(equivalents.saponifiable), minus(exact(1), exact(superfat)));
  return {
    id: 'hydroxide',
    subject: null,
    steps: [
      step({
        kind: 'hydroxide',
        symbol: symbol('n', 'OH'),
        equation: sumOf(
          product(symbol('E'), minus(exact(1), symbol('s'))),
          ...(equivalents.acid > 0 ? [symbol('n', 'acid')] : []),
        ),
        numbers: equivalents.acid > 0 ? sumOf(kept, figure(equivalents.acid)) : kept,
        value: equivalents.hydroxide,
        unit: 'mol',
      }),
    ],
  };
}
