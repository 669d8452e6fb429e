import { named, type Working } from './context.ts';
import { molarMassTerm } from './molar-masses.ts';
import { type Section, type Step, step } from './step.ts';
import { exact, figure, fractionOf, product, sumOf, symbol, type Term } from './term.ts';

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
