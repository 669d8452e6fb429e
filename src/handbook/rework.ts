import type { BatchDocument } from '../formulary/document.ts';
import type { Formula } from '../formulary/formula.ts';
import type { Shop } from '../reference/shop-records.ts';

/** What joins then is no part of the batter. */
const LATER: readonly string[] = ['after-cook', 'dilution'];

/**
 * The most soap made before that may go into a batch: the lower of the shop's cap and the formula's own
 * limit [percent of the batter], and that share of what is weighed before the cook's end and before dilution
 * [g]. `null` where neither is stated.
 */
export function reworkLimit(
  formula: Pick<Formula, 'rework'>,
  batch: Pick<BatchDocument, 'total' | 'afterCookFats' | 'liquids' | 'additives'>,
  shop: Pick<Shop, 'reworkCap'>,
): { readonly percent: number; readonly mass: number } | null {
  const stated = [formula.rework, shop.reworkCap].filter((limit) => typeof limit === 'number');
  if (stated.length === 0 || batch.total === null) return null;
  const percent = Math.min(...stated);
  const later = [
    ...batch.afterCookFats,
    ...[...batch.liquids, ...batch.additives].filter(({ at }) => LATER.includes(at)),
  ];
  const batter = batch.total - later.reduce((sum, { weighedMass }) => sum + weighedMass, 0);
  return { percent, mass: (batter * percent) / 100 };
}
