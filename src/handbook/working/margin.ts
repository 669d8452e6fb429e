import { superfatMargin } from '../../chemistry/margin.ts';
import type { Range } from '../../chemistry/quantity.ts';
import { equivalentsOf, type Reading, superfatFrom } from '../../chemistry/superfat.ts';
import { superfatStep } from './check.ts';
import { named, type Working } from './context.ts';
import { type FatRange, fatRanges, halfWidth } from './fat-ranges.ts';
import { molarMassTerm } from './molar-masses.ts';
import { type Section, type Step, step } from './step.ts';
import {
  exact,
  figure,
  fractionOf,
  minus,
  product,
  rootOf,
  squareOf,
  sumOf,
  symbol,
  type Term,
} from './term.ts';

/** The expanded interval and the worst case, contribution by contribution. */
export function margin(working: Working): Section {
  const { charge, reference } = working;
  const { constants } = reference;
  const waxAsAcids = charge.formulation.process === 'cold';
  const centre: Reading = { fats: 'middle', assay: 'middle', waxAsAcids };
  const worst: Reading = { fats: 'low', assay: 'high', waxAsAcids };
  const atCentre = equivalentsOf(charge, centre, constants);
  const atWorst = equivalentsOf(charge, worst, constants);
  const outcome = superfatMargin(charge, constants);
  if (!outcome.ok)
    throw new RangeError(`a formula without a margin has no working: ${outcome.breach.rule}`);
  const result = outcome.value;

  const fats = fatRanges(working, waxAsAcids);
  const contributions = [
    ...fats.map(({ id, of, mass, range }) =>
      contribution(
        id,
        named(working, of),
        product(
          HUNDRED,
          fractionOf(
            atCentre.acid > 0
              ? minus(figure(atCentre.hydroxide), figure(atCentre.acid))
              : figure(atCentre.hydroxide),
            squareOf(figure(atCentre.saponifiable)),
          ),
          fractionOf(
            product(figure(mass, 8), halfWidth(range)),
            product(exact(1000), molarMassTerm(constants.hydroxide.K)),
          ),
        ),
        working,
      ),
    ),
    ...charge.alkali.map(({ supply, weighedMass }) =>
      contribution(
        `assay:${supply.id}`,
        named(working, supply.id),
        product(
          HUNDRED,
          fractionOf(
            product(figure(weighedMass), halfWidth(supply.assay)),
            product(
              molarMassTerm(constants.hydroxide[supply.cation]),
              figure(atCentre.saponifiable),
            ),
          ),
        ),
        working,
      ),
    ),
  ];
  const together = Math.sqrt(
    working.document.superfat.budget.reduce((sum, { halfWidth }) => sum + halfWidth ** 2, 0),
  );
  const centrePercent = superfatFrom(atCentre) * 100;
  const { expanded, worstCase } = result;
  const clipped = centrePercent - together < worstCase.low * 100;
  return {
    id: 'margin',
    subject: null,
    steps: [
      sumStep(
        'middle-equivalents',
        'E',
        fats,
        (range) => (range.low + range.high) / 2,
        atCentre.saponifiable,
        working,
      ),
      hydroxideStep(
        'middle-hydroxide',
        (assay) => (assay.low + assay.high) / 2,
        atCentre.hydroxide,
        working,
      ),
      superfatStep('middle-superfat', atCentre, centrePercent),
      ...contributions,
      step({
        kind: 'half-width',
        symbol: symbol('U'),
        numbers: rootOf(sumOf(...contributions.map(({ result }) => squareOf(result)))),
        value: together,
        digits: digitsOf(together),
        // each contribution is rounded by itself
        within: 0.0005 * Math.max(1, Math.sqrt(contributions.length)),
        unit: '%',
      }),
      sumStep('worst-equivalents', 'E', fats, (range) => range.low, atWorst.saponifiable, working),
      hydroxideStep('worst-hydroxide', (assay) => assay.high, atWorst.hydroxide, working),
      superfatStep('worst-superfat', atWorst, worstCase.low * 100),
      step({
        kind: 'expanded-low',
        symbol: symbol('s', 'low'),
        ...(clipped ? {} : { equation: minus(symbol('s', 'centre'), symbol('U')) }),
        numbers: clipped
          ? figure(worstCase.low * 100, digitsOf(worstCase.low * 100))
          : minus(
              figure(centrePercent, digitsOf(centrePercent)),
              figure(together, digitsOf(together)),
            ),
        value: expanded.low * 100,
        digits: digitsOf(expanded.low * 100),
        within: 0.002,
        unit: '%',
      }),
    ],
  };
}

const HUNDRED = exact(100);

/** Digits that print a percentage to the same thousandth whether it has one place before the point or two. */
const digitsOf = (percent: number): number => (Math.abs(percent) >= 10 ? 5 : 4);

function contribution(id: string, subject: string, numbers: Term, working: Working): Step {
  const value = working.document.superfat.budget.find((part) => part.id === id)?.halfWidth;
  return step({
    kind: 'contribution',
    of: id.replace(':', '-'),
    subject,
    symbol: symbol('U', subject),
    numbers,
    value: value ?? Number.NaN,
    digits: digitsOf(value ?? 0),
    within: 0.0005,
    unit: '%',
  });
}

function sumStep(
  kind: 'middle-equivalents' | 'worst-equivalents',
  name: string,
  fats: readonly FatRange[],
  pick: (range: Range<number>) => number,
  value: number,
  { reference }: Working,
): Step {
  return step({
    kind,
    symbol: symbol(name),
    numbers: fractionOf(
      sumOf(...fats.map(({ mass, range }) => product(figure(mass, 8), figure(pick(range), 8)))),
      product(exact(1000), molarMassTerm(reference.constants.hydroxide.K)),
    ),
    value,
    unit: 'mol',
  });
}

function hydroxideStep(
  kind: 'middle-hydroxide' | 'worst-hydroxide',
  pick: (assay: Range<number>) => number,
  value: number,
  { charge, reference }: Working,
): Step {
  return step({
    kind,
    symbol: symbol('n', 'OH'),
    numbers: sumOf(
      ...charge.alkali.map(({ supply, weighedMass }) =>
        fractionOf(
          product(figure(weighedMass, 7), figure(pick(supply.assay))),
          molarMassTerm(reference.constants.hydroxide[supply.cation]),
        ),
      ),
    ),
    value,
    unit: 'mol',
  });
}
