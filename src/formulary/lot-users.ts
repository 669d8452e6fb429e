import type { AlkaliLot, FatLot } from '../reference/lot-records.ts';
import type { Formula } from './formula.ts';

/**
 * The formulas in use that weigh the material of a lot, by itself or in a blend. The fat of a liquid is not
 * from a lot, and a withdrawn formula weighs nothing.
 */
export function usersOfLot(
  lot: FatLot | AlkaliLot,
  formulas: readonly Formula[],
): readonly Formula[] {
  return formulas.filter((formula) => !formula.withdrawn && weighs(formula, lot));
}

function weighs({ fats, afterCookFats, alkali }: Formula, lot: FatLot | AlkaliLot): boolean {
  if ('fat' in lot) return [...fats, ...afterCookFats].some(({ fat }) => fat === lot.fat);
  return (lot.alkali === 'sodium-hydroxide' ? alkali.sodium : alkali.potassium) > 0;
}
