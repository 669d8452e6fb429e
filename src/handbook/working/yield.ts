import { massBalance } from '../../chemistry/balance.ts';
import type { Working } from './context.ts';
import { molarMassTerm } from './molar-masses.ts';
import { type Section, type Step, step } from './step.ts';
import { exact, figure, fractionOf, minus, product, sumOf, symbol } from './term.ts';

const HUNDRED = exact(100);

/** Values of the blend that can be checked from its fats and acids; `null` without a profile. */
export function profile(working: Working): Section | null {
  const { document, charge } = working;
  const measured = document.profile;
  if (!measured) return null;
  const fats = [...charge.fats, ...charge.afterCookFats];
  const total = fats.reduce((sum, { mass }) => sum + mass, 0);
  const acid = (id: string) => figure(measured.acids[id] ?? 0);
  return {
    id: 'profile',
    subject: null,
    steps: [
      step({
        kind: 'mixed-saponification-value',
        symbol: symbol('S'),
        numbers: fractionOf(
          sumOf(
            ...fats.map(({ fat, mass }) =>
              product(figure(mass, 8), figure(fat.saponificationValue.value, 8)),
            ),
          ),
          figure(total),
        ),
        value: measured.saponificationValue,
        digits: 5,
        unit: 'mg KOH/g',
      }),
      step({
        kind: 'oxidisability',
        symbol: symbol('COX'),
        numbers: fractionOf(
          sumOf(
            acid('C18:1'),
            product(exact(10.3), acid('C18:2')),
            product(exact(21.6), acid('C18:3')),
          ),
          HUNDRED,
        ),
        value: measured.oxidisability,
        digits: 5,
        unit: '1',
      }),
      step({
        kind: 'bis-allylic',
        symbol: symbol('BAPE'),
        numbers: sumOf(acid('C18:2'), product(exact(2), acid('C18:3'))),
        value: measured.bisAllylicPositions,
        digits: 5,
        unit: '1',
      }),
    ],
  };
}

/** Glycerol and total fatty matter, from the masses of the closed balance. */
export function yieldSection(working: Working): Section {
  const { charge, document, reference } = working;
  const balance = massBalance(charge, reference.constants);
  const { glycerol: molarMass } = reference.constants;
  const reacted = (3 * balance.glycerol) / molarMass;
  const fatty = sumOf(
    figure(balance.acidsInSoap),
    figure(balance.unsaponifiedFat),
    figure(balance.unsaponifiable),
  );
  const percentOf = (part: typeof fatty, whole: number) =>
    product(HUNDRED, fractionOf(part, figure(whole)));
  const { yield: given } = document;
  const steps: Step[] = [
    step({
      kind: 'glycerol',
      symbol: symbol('m', 'glycerol'),
      equation: fractionOf(product(symbol('n', 'esters'), symbol('M', 'C3H8O3')), exact(3)),
      numbers: fractionOf(product(figure(reacted), molarMassTerm(molarMass)), exact(3)),
      value: given.glycerol,
      unit: 'g',
    }),
    step({
      kind: 'fresh-moisture',
      symbol: symbol('w', 'fresh'),
      numbers: percentOf(figure(given.water), given.total),
      value: given.moisture.fresh,
      digits: 5,
      unit: '%',
    }),
    step({
      kind: 'fresh-tfm',
      symbol: symbol('TFM'),
      numbers: percentOf(fatty, given.total),
      value: given.totalFattyMatter.fresh,
      digits: 5,
      unit: '%',
    }),
  ];
  if (given.releasedMass < given.total) {
    steps.push(
      step({
        kind: 'released-mass',
        symbol: symbol('m', 'released'),
        numbers: fractionOf(
          minus(figure(given.total), figure(given.water)),
          minus(exact(1), fractionOf(figure(given.moisture.released), HUNDRED)),
        ),
        value: given.releasedMass,
        unit: 'g',
      }),
      step({
        kind: 'released-tfm',
        symbol: symbol('TFM'),
        numbers: percentOf(fatty, given.releasedMass),
        value: given.totalFattyMatter.released,
        digits: 5,
        unit: '%',
      }),
    );
  }
  return { id: 'yield', subject: null, steps };
}
