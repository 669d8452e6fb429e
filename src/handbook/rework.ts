import type { BatchDocument } from '../formulary/document.ts';
import type { Formula } from '../formulary/formula.ts';
import type { Shop } from '../reference/shop-records.ts';

/**
 * The most soap made before that may go into a batch: the lower of the shop's cap and the formula's own
 * limit [percent of the batter], and that share of all that is weighed [g]. `null` where neither is stated.
 */
export function reworkLimit(
  formula: Pick<Formula, 'rework'>,
  batch: Pick<BatchDocument, 'total'>,
  shop: Pick<Shop, 'reworkCap'>,
): { readonly percent: number; readonly mass: number } | null {
  const stated = [formula.rework, shop.reworkCap].filter((limit) => typeof limit === 'number');
  if (stated.length === 0 || batch.total === null) return null;
  const percent = Math.min(...stated);
  return { percent, mass: (batch.total * percent) / 100 };
}
