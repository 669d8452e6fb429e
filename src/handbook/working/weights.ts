import { alkaliPerMole } from '../../chemistry/alkali.ts';
import { equivalentsPerGram, isBeforeSaponification } from '../../chemistry/saponification.ts';
import { finalSuperfat, superfatIfAcidForgotten } from '../../chemistry/superfat.ts';
import { molarMassTerm } from './basics.ts';
import { named, type Working } from './context.ts';
import { type Section, type Step, step } from './step.ts';
import { exact, figure, fractionOf, minus, product, sumOf, symbol, type Term } from './term.ts';

const HUNDRED = exact(100);

/** m = n M / assay for each alkali; mixed lye with its parts first. */
export function alkali(working: Working): Section {
  const { charge, equivalents, reference } = working;
  const mixed = charge.alkali.length > 1;
  const steps = charge.alkali.flatMap(({ supply, moles, pureMass, weighedMass }): Step[] => {
    const subject = named(working, supply.id);
    const fraction = moles / equivalents.hydroxide;
    return [
      ...(mixed
        ? [
            step({
              kind: 'mole-fraction',
              of: supply.id,
              subject,
              symbol: symbol('x', supply.cation),
              numbers: moleFraction(working, supply.id),
              value: fraction,
              unit: '1',
            }),
          ]
        : []),
      step({
        kind: 'pure-alkali',
        of: supply.id,
        subject,
        symbol: symbol('m', 'pure'),
        equation: product(symbol('n', 'OH'), ...(mixed ? [symbol('x')] : []), symbol('M')),
        numbers: product(
          figure(equivalents.hydroxide),
          ...(mixed ? [figure(fraction)] : []),
          molarMassTerm(reference.constants.hydroxide[supply.cation]),
        ),
        value: pureMass,
        unit: 'g',
      }),
      step({
        kind: 'weighed-alkali',
        of: supply.id,
        subject,
        symbol: symbol('m', 'weighed'),
        equation: fractionOf(symbol('m', 'pure'), symbol('a')),
        numbers: fractionOf(figure(pureMass), figure(supply.assay.value)),
        value: weighedMass,
        unit: 'g',
        sources: assaySources(working, supply.id),
      }),
    ];
  });
  return { id: 'alkali', subject: null, steps };
}

/** By moles the share itself; by mass the share over its molar mass, of the sum of all such. */
function moleFraction({ charge, reference }: Working, id: string): Term {
  const { alkali, basis } = charge.formulation;
  const part = alkali.find(({ supply }) => supply.id === id);
  if (!part) throw new RangeError(`No alkali ${id} in the formula`);
  if (basis === 'moles') return exact(part.share);
  const perMass = ({ supply, share }: (typeof alkali)[number]) =>
    fractionOf(exact(share), molarMassTerm(reference.constants.hydroxide[supply.cation]));
  return fractionOf(perMass(part), sumOf(...alkali.map(perMass)));
}

function assaySources({ reference, document }: Working, id: string): string[] {
  const lotName = document.alkali.find((line) => line.id === id)?.assay.lot;
  const lot = reference.lots.alkalis.find((lot) => lot.alkali === id && lot.lot === lotName);
  return lot ? [`${lot.lot}: ${lot.assay} ± ${lot.uncertainty} %`] : [];
}

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
          product(figure(ruled), fractionOf(minus(exact(1), exact(rule.value)), exact(rule.value))),
          (ruled * (1 - rule.value)) / rule.value,
        ]
      : rule.form === 'per-alkali'
        ? [
            product(symbol('r'), symbol('m', 'alkali')),
            product(exact(rule.value), figure(ruled)),
            ruled * rule.value,
          ]
        : [
            product(symbol('p'), symbol('m', 'fats')),
            product(exact(rule.value), figure(fats)),
            fats * rule.value,
          ];
  const steps = [
    step({ kind: 'water-total', symbol: symbol('W'), equation, numbers, value: total, unit: 'g' }),
  ];
  let left = figure(total);
  const takeAway = (kind: 'water-from-liquids' | 'water-in-stock', part: Step) => {
    steps.push({ ...part, kind });
    left = minus(left, part.result);
  };
  if (liquids.length > 0) {
    takeAway(
      'water-from-liquids',
      step({
        kind: 'water-from-liquids',
        symbol: symbol('W', 'liquids'),
        equation: product(symbol('m'), symbol('w')),
        numbers: sumOf(
          ...charge.liquids.map(({ liquid, mass }) => product(figure(mass), exact(liquid.water))),
        ),
        value: charge.liquids.reduce((sum, { liquid, mass }) => sum + mass * liquid.water, 0),
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
            minus(figure(weighedMass), figure(pureMass)),
          ),
        ),
        value: stock,
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

/** s back from the masses; with the acid left out; and with what joins after saponification. */
export function check(working: Working): Section {
  const { charge, equivalents, reference } = working;
  const superfat = superfatStep('superfat', equivalents, charge.formulation.superfat * 100);
  const steps = [superfat];
  if (equivalents.acid > 0) {
    steps.push(
      superfatStep(
        'acid-forgotten',
        { ...equivalents, acid: 0 },
        superfatIfAcidForgotten(equivalents) * 100,
      ),
    );
  }
  const laterFats = [
    ...charge.afterCookFats,
    ...charge.liquids.flatMap(({ liquid, mass, at }) =>
      liquid.fatData && !isBeforeSaponification(at)
        ? [{ fat: liquid.fatData, mass: mass * liquid.fat }]
        : [],
    ),
  ].map(({ fat, mass }) => ({
    mass,
    perGram: equivalentsPerGram(fat.saponificationValue.value, reference.constants),
  }));
  const laterAcids = [
    ...charge.additives.map(({ additive, mass, at }) => ({ acidity: additive.acidity, mass, at })),
    ...charge.liquids.map(({ liquid, mass, at }) => ({ acidity: liquid.acidity, mass, at })),
  ].filter(({ acidity, at }) => acidity > 0 && !isBeforeSaponification(at));
  if (laterFats.length === 0 && laterAcids.length === 0)
    return { id: 'check', subject: null, steps };

  const saponifiable =
    equivalents.saponifiable +
    laterFats.reduce((sum, { mass, perGram }) => sum + mass * perGram, 0);
  const acid =
    equivalents.acid + laterAcids.reduce((sum, { mass, acidity }) => sum + mass * acidity, 0);
  steps.push(
    step({
      kind: 'final-equivalents',
      symbol: symbol('E', 'final'),
      numbers: sumOf(
        figure(equivalents.saponifiable),
        ...laterFats.map(({ mass, perGram }) => product(figure(mass), figure(perGram))),
      ),
      value: saponifiable,
      unit: 'mol',
    }),
  );
  if (acid > 0) {
    steps.push(
      step({
        kind: 'final-acid',
        symbol: symbol('n', 'acid'),
        numbers: sumOf(
          figure(equivalents.acid),
          ...laterAcids.map(({ mass, acidity }) => product(figure(mass), figure(acidity))),
        ),
        value: acid,
        unit: 'mol',
      }),
    );
  }
  steps.push(
    superfatStep(
      'final-superfat',
      { saponifiable, acid, hydroxide: equivalents.hydroxide },
      finalSuperfat(charge, reference.constants) * 100,
    ),
  );
  return { id: 'check', subject: null, steps };
}

/** s = 100 (1 - (n(OH) - n(acid)) / E), in percent. */
export function superfatStep(
  kind: Step['kind'],
  { saponifiable, acid, hydroxide }: Working['equivalents'],
  percent: number,
  of?: string,
): Step {
  const net = acid > 0 ? minus(figure(hydroxide, 7), figure(acid, 7)) : figure(hydroxide, 7);
  const netSymbol = acid > 0 ? minus(symbol('n', 'OH'), symbol('n', 'acid')) : symbol('n', 'OH');
  return step({
    kind,
    ...(of && { of }),
    symbol: symbol('s'),
    equation: product(HUNDRED, minus(exact(1), fractionOf(netSymbol, symbol('E')))),
    numbers: product(HUNDRED, minus(exact(1), fractionOf(net, figure(saponifiable, 7)))),
    value: percent,
    digits: 4,
    // seven digits of two amounts leave this much of a small difference
    within: 0.0002,
    unit: '%',
  });
}
