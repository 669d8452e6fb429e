import { equivalentsPerGram, isBeforeSaponification } from '../../chemistry/saponification.ts';
import { finalSuperfat, superfatIfAcidForgotten } from '../../chemistry/superfat.ts';
import type { Working } from './context.ts';
import { type Section, type Step, step } from './step.ts';
import { exact, figure, fractionOf, minus, product, sumOf, symbol } from './term.ts';

const HUNDRED = exact(100);

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
    // half of the seventh digit of each amount, however small their difference
    within: (100 * 5e-7 * (2 * hydroxide + 2 * acid)) / saponifiable,
    unit: '%',
  });
}
