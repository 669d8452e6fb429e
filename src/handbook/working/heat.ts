import { interpolate } from '../../chemistry/interpolate.ts';
import { lyeOf } from '../../chemistry/lye.ts';
import { HEAT_OF_NEUTRALISATION } from '../../chemistry/lye-heat.ts';
import { temperature } from '../../words/measures.ts';
import { cited, type Working } from './context.ts';
import { molarMassTerm } from './molar-masses.ts';
import { type Section, step } from './step.ts';
import { exact, figure, fractionOf, product, sumOf, symbol } from './term.ts';

const HUNDRED = exact(100);

/** T = T0 + 1000 (n q + n(acid) 55.8) / (m c); `null` where the model gives no number. */
export function heat(working: Working): Section | null {
  const { charge, document, reference, equivalents } = working;
  const peak = document.lye.peakTemperature;
  const supply = charge.alkali[0]?.supply;
  if (peak === null || !supply) return null;
  const { constants, tables, shop } = reference;
  const lye = lyeOf(charge);
  const data = tables.lyeHeat[supply.cation];
  const dilution = lye.water / constants.water / equivalents.hydroxide;
  const percent = lye.pureAsMade * 100;
  const perMole = (interpolate(data.heatOfSolution, dilution) ?? Number.NaN) + data.newerSetAdds;
  const capacity = Math.min(
    ...data.heatCapacities.flatMap((curve) => interpolate(curve, percent) ?? []),
  );
  const pure = charge.alkali.reduce((sum, { pureMass }) => sum + pureMass, 0);
  let acid = 0;
  for (const { additive, mass, at } of charge.additives) {
    if (at === 'lye') acid += mass * additive.acidity;
  }
  for (const { liquid, mass, at } of charge.liquids) {
    if (at === 'lye') acid += mass * liquid.acidity;
  }
  const released = product(figure(equivalents.hydroxide), figure(perMole));
  return {
    id: 'heat',
    subject: null,
    steps: [
      step({
        kind: 'water-per-hydroxide',
        symbol: symbol('r'),
        equation: fractionOf(symbol('m', 'water'), product(symbol('M', 'H2O'), symbol('n', 'OH'))),
        numbers: fractionOf(
          figure(lye.water),
          product(molarMassTerm(constants.water), figure(equivalents.hydroxide)),
        ),
        value: dilution,
        digits: 5,
        unit: 'mol/mol',
      }),
      step({
        kind: 'pure-percent',
        symbol: symbol('w'),
        numbers: product(HUNDRED, fractionOf(figure(pure), sumOf(figure(pure), figure(lye.water)))),
        value: percent,
        digits: 5,
        unit: '%',
      }),
      step({
        kind: 'heat-per-mole',
        symbol: symbol('q'),
        numbers: sumOf(figure(perMole - data.newerSetAdds), exact(data.newerSetAdds)),
        value: perMole,
        unit: 'kJ/mol',
        sources: tables.lyeHeatSources[supply.cation].map((each) => cited(reference, each)),
      }),
      step({
        kind: 'heat-capacity',
        symbol: symbol('c'),
        numbers: figure(capacity),
        value: capacity,
        unit: 'J/(g K)',
        sources: tables.heatCapacitySources[supply.cation].map((each) => cited(reference, each)),
      }),
      step({
        kind: 'peak-temperature',
        symbol: symbol('T'),
        equation: sumOf(
          symbol('T', '0'),
          fractionOf(
            product(exact(1000), symbol('n', 'OH'), symbol('q')),
            product(symbol('m', 'lye'), symbol('c')),
          ),
        ),
        numbers: sumOf(
          exact(shop.startTemperature),
          fractionOf(
            product(
              exact(1000),
              acid > 0
                ? sumOf(released, product(figure(acid), exact(HEAT_OF_NEUTRALISATION)))
                : released,
            ),
            product(figure(lye.mass), figure(capacity)),
          ),
        ),
        value: peak,
        digits: 5,
        unit: '°C',
        printed: temperature(peak),
      }),
    ],
  };
}
