import { COMMON_PRACTICE } from '../../reference/caution-thresholds.ts';
import { fragrancesOf } from '../fragrances.ts';
import type { CautionRule } from '../rule.ts';

/** More of a fragrance in the released soap than its supplier allows. */
export const rule: CautionRule<'fragrance-above-maximum'> = {
  id: 'fragrance-above-maximum',
  severity: 'warning',
  basis: COMMON_PRACTICE,
  applies: (context) =>
    fragrancesOf(context).flatMap(({ name, percentOfProduct, maximum }) =>
      maximum !== null && percentOfProduct > maximum
        ? [{ materials: name, percent: percentOfProduct, maximum }]
        : [],
    ),
};
