import { superfatMargin } from '../chemistry/margin.ts';
import { type Grams, grams } from '../chemistry/quantity.ts';
import { reckon } from '../chemistry/reckon.ts';
import type { Reference } from '../reference/reference.ts';
import type { FormulaDocument } from './document.ts';
import type { Formula } from './formula.ts';
import { prepareFormulation } from './formulation.ts';
import { withoutLots } from './lots.ts';
import { percentRange } from './percent-range.ts';

type Ends = Pick<FormulaDocument['superfat'], 'expanded' | 'worstCase'>;

const MASS_OF_FATS: Grams = grams(1000);

/**
 * The superfat margin that a formula would have if no lot were released: reckoned anew, weights and all, by
 * published and trade ranges. `null` where that is the margin it has anyway, or where the formula could not
 * be made of what the trade sells.
 */
export function marginWithoutLots(
  formula: Formula,
  inForce: Ends,
  reference: Reference,
): FormulaDocument['superfat']['withoutLots'] {
  const { fats, alkalis } = reference.lots;
  if (fats.length === 0 && alkalis.length === 0) return null;
  const prepared = prepareFormulation(formula, withoutLots(reference));
  if (!prepared.ok) return null;
  const reckoned = reckon(prepared.formulation, MASS_OF_FATS, reference.constants);
  if (!reckoned.ok) return null;
  const margin = superfatMargin(reckoned.value, reference.constants);
  if (!margin.ok) return null;
  const ends = {
    expanded: percentRange(margin.value.expanded),
    worstCase: percentRange(margin.value.worstCase),
  };
  // the same arithmetic on the same numbers, so where no lot decides the bits are the same
  const same = (['expanded', 'worstCase'] as const).every((name) =>
    ends[name].every((end, i) => end === inForce[name][i]),
  );
  return same ? null : ends;
}
