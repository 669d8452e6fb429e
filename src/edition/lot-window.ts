import type { Formula } from '../formulary/formula.ts';
import { usersOfLot } from '../formulary/lot-users.ts';
import { decidingValue } from '../formulary/lots.ts';
import type { AlkaliLot, FatLot } from '../reference/lot-records.ts';
import type { Reference } from '../reference/reference.ts';
import type { Problem } from '../words/problem.ts';
import { editionProblem } from './edition-problem.ts';

/**
 * Released lots whose measured value lies outside the range that formulas were approved for: the published
 * range of a fat, the trade range of a solid alkali. A lot that no formula uses is left alone. A stock
 * solution has no trade range; its strength is the shop's own, and the core holds it against the lye.
 */
export function lotWindowProblems(
  formulas: readonly Formula[],
  reference: Reference,
): readonly Problem[] {
  return [
    ...reference.lots.fats.filter(isReleased).flatMap((lot) => {
      const core = reference.fats.get(lot.fat)?.core;
      const measured = core ? decidingValue(lot, core.kind) : null;
      const users = usersOfLot(lot, formulas);
      if (!core || !measured || users.length === 0) return [];
      const { low, high } = core.saponificationValue;
      if (isWithin(measured.value, { low, high })) return [];
      const found = `lot ${lot.lot} of ${lot.fat} with a value of ${measured.value} mg KOH/g (${measured.method})`;
      return [outside(lot, found, `${low} to ${high}`, users)];
    }),
    ...reference.lots.alkalis.filter(isReleased).flatMap((lot) => {
      const assay = reference.alkalis.get(lot.alkali)?.trade.assay;
      const users = usersOfLot(lot, formulas);
      if (!assay || lot.form === 'solution' || users.length === 0) return [];
      const window = { low: assay.low * 100, high: assay.high * 100 };
      if (isWithin(lot.assay, window)) return [];
      const found = `lot ${lot.lot} of ${lot.alkali} with an assay of ${lot.assay} %`;
      return [outside(lot, found, `${plain(window.low)} to ${plain(window.high)} %`, users)];
    }),
  ];
}

const isReleased = ({ status }: FatLot | AlkaliLot) => status === 'released';

/** Percents come from fractions; the last bit of that is no reason to refuse a lot. */
const SLACK = 1e-9;

const isWithin = (value: number, { low, high }: { readonly low: number; readonly high: number }) =>
  value >= low - SLACK && value <= high + SLACK;

const plain = (value: number) => String(Number(value.toPrecision(9)));

function outside(
  { place }: FatLot | AlkaliLot,
  found: string,
  window: string,
  users: readonly Formula[],
): Problem {
  return editionProblem(place, 'edition/lot-outside-window', {
    found,
    expected: `${window}, which is what ${users.map(({ code }) => code).join(', ')} ${users.length === 1 ? 'was' : 'were'} approved for`,
    advice: 'have the lot measured again, or set its status to quarantine',
  });
}
