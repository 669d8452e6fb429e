import type { Charge } from '../chemistry/charge.ts';
import { superfatMargin } from '../chemistry/margin.ts';
import { type Grams, grams } from '../chemistry/quantity.ts';
import { reckon } from '../chemistry/reckon.ts';
import type { Reference } from '../reference/reference.ts';
import type { FormulaDocument } from './document.ts';
import type { Formula } from './formula.ts';
import { prepareFormulation } from './formulation.ts';
import { alkaliInForce, fatInForce, withoutLots } from './lots.ts';
import { percentRange } from './percent-range.ts';

const MASS_OF_FATS: Grams = grams(1000);

/**
 * The superfat margin that a formula would have if no lot were released: reckoned anew, weights and all, by
 * published and trade ranges. `null` where no lot moves the margin anyway, or where the formula could not be
 * made of what the trade sells.
 */
export function marginWithoutLots(
  formula: Formula,
  charge: Charge,
  reference: Reference,
): FormulaDocument['superfat']['withoutLots'] {
  if (!isLotInForce(charge, reference)) return null;
  const prepared = prepareFormulation(formula, withoutLots(reference));
  if (!prepared.ok) return null;
  const reckoned = reckon(prepared.formulation, MASS_OF_FATS, reference.constants);
  if (!reckoned.ok) return null;
  const { expanded, worstCase } = superfatMargin(reckoned.value, reference.constants);
  return { expanded: percentRange(expanded), worstCase: percentRange(worstCase) };
}

function isLotInForce({ fats, alkali }: Charge, reference: Reference): boolean {
  return (
    fats.some(({ fat: { id } }) => {
      const core = reference.fats.get(id)?.core;
      return core ? fatInForce(core, reference).fat !== core : false;
    }) ||
    alkali.some(({ supply: { id } }) => {
      const record = reference.alkalis.get(id);
      return record ? alkaliInForce(record, reference).lot !== null : false;
    })
  );
}
