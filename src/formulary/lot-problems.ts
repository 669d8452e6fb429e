import type { Reference } from '../reference/reference.ts';
import { dataProblem } from '../reference/report.ts';
import type { Problem } from '../words/problem.ts';
import type { Formula } from './formula.ts';
import { usersOfLot } from './lot-users.ts';

/**
 * Released lots past their retest date on the day `asOf`, `2026-12-01`; the date itself is still good. An
 * error where formulas are weighed from the lot, a warning where none is.
 */
export function lotProblems(
  { lots }: Pick<Reference, 'lots'>,
  formulas: readonly Formula[],
  asOf: string,
): readonly Problem[] {
  return [...lots.fats, ...lots.alkalis]
    .filter(({ status, retestBy }) => status === 'released' && retestBy < asOf)
    .map((lot) => {
      const codes = usersOfLot(lot, formulas).map(({ code }) => code);
      const material = 'fat' in lot ? lot.fat : lot.alkali;
      const used =
        codes.length === 0
          ? 'of which no formula is weighed'
          : `of which ${codes.sort().join(', ')} ${codes.length === 1 ? 'is' : 'are'} weighed`;
      return dataProblem(lot.place.file, lot.place, 'data/lot-past-retest', {
        severity: codes.length === 0 ? 'warning' : 'error',
        found: `retest by ${lot.retestBy} for lot "${lot.lot}" of ${material}, ${used}`,
        expected: `a day not before ${asOf}, the day that this is for`,
        advice: 'have the lot measured again, release another one, or set it to quarantine',
      });
    });
}
