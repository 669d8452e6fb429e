import type { Charge } from '../chemistry/charge.ts';
import { grams, type Outcome } from '../chemistry/quantity.ts';
import { reckon } from '../chemistry/reckon.ts';
import type { Formula } from '../formulary/formula.ts';
import { prepareFormulation } from '../formulary/formulation.ts';
import { withoutLots } from '../formulary/lots.ts';
import type { Reference } from '../reference/reference.ts';

/**
 * A formula for 1000 g of fats with published values, which is what an approval is of: a new lot does not
 * change it.
 *
 * @throws RangeError for a formula with ids that the data do not have; one from a formulary has none.
 */
export function publishedCharge(formula: Formula, reference: Reference): Outcome<Charge> {
  const prepared = prepareFormulation(formula, withoutLots(reference));
  if (!prepared.ok) throw new RangeError(`no data for ${prepared.missing[0]?.id}`);
  return reckon(prepared.formulation, grams(1000), reference.constants);
}
