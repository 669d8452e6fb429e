import type { Charge } from '../chemistry/charge.ts';
import { interpolate } from '../chemistry/interpolate.ts';
import { lyeOf } from '../chemistry/lye.ts';
import type { Breach } from '../chemistry/quantity.ts';
import type { Reference } from '../reference/reference.ts';
import type { Problem } from '../words/problem.ts';
import type { Formula } from './formula.ts';

/** Room temperature, at which a lye must hold its alkali in solution. [degC] */
const ROOM = 25;

function problemAt(
  formula: Formula,
  path: string,
  rule: string,
  text: Pick<Problem, 'found' | 'expected' | 'advice'>,
): Problem {
  const place = formula.places.get(path) ?? formula.places.get(path.split('.')[0] ?? '');
  return {
    rule,
    severity: 'error',
    file: formula.file,
    ...(place ?? { line: 1, column: 1 }),
    ...text,
  };
}

/** A material that is known by name but has no saponification value with a range. */
export function missingProblem(
  formula: Formula,
  { path, id }: { readonly path: string; readonly id: string },
): Problem {
  return problemAt(formula, path, 'formula/no-data', {
    found: `"${id}", for which the data give nothing to compute with`,
    expected: 'a material with a saponification value and its range, or its water content',
    advice: 'add a sourced range to its data file or a measured lot',
  });
}

/** The core's refusal of a whole formula, at the line that causes it. */
export function refusalProblem(formula: Formula, { rule, numbers }: Breach): Problem {
  if (rule === 'stock-weaker-than-lye') {
    return problemAt(formula, 'water', 'formula/stock-too-weak', {
      found: 'a stock lye in force that is weaker than the lye asked for',
      expected: 'a lye no stronger than the stock',
      advice: 'lower the lye concentration or release a lot of solid alkali',
    });
  }
  return problemAt(formula, 'liquids', 'formula/liquids-out-of-range', {
    found: `liquids whose fat and acid need more alkali than their water can carry (${numbers.remaining?.toFixed(3)})`,
    expected: 'liquids that replace only part of the water',
    advice: 'lower replaces-water',
  });
}

/** Waxes alone in a cold process: nothing says that any of the alkali is used up. */
export const waxProblem = (formula: Formula): Problem =>
  problemAt(formula, 'fats', 'formula/nothing-saponifies', {
    found:
      'fats of which nothing may become soap: in a cold process a wax counts by its acid value alone',
    expected: 'a fat that the alkali is sure to react with',
    advice: 'add one, or cook the soap',
  });

/** What is wrong with a charge as a whole: a lye that cannot hold its alkali. */
export function chargeProblems(
  formula: Formula,
  charge: Charge,
  reference: Reference,
): readonly Problem[] {
  if (charge.alkali.every(({ supply }) => supply.form === 'solution')) return [];
  const percent = 100 * lyeOf(charge).pureAsMade;
  const limits = charge.alkali.flatMap(
    ({ supply }) => interpolate(reference.tables.lyeHeat[supply.cation].saturation, ROOM) ?? [],
  );
  const limit = Math.min(...limits);
  if (percent <= limit) return [];
  return [
    problemAt(formula, 'water', 'formula/lye-does-not-dissolve', {
      found: `a lye of ${percent.toFixed(1)} % hydroxide as it stands in the pot`,
      expected: `at most ${limit} %, what dissolves at ${ROOM} degrees Celsius`,
      advice: 'give more water, hold less back, or let the liquids join at the lye',
    }),
  ];
}
