import { COMMON_PRACTICE } from '../../reference/caution-thresholds.ts';
import { fragrancesOf } from '../fragrances.ts';
import type { CautionRule } from '../rule.ts';

/** A fragrance whose supplier's maximum for soap is not in the data. */
export const rule: CautionRule<'fragrance-maximum-unknown'> = {
  id: 'fragrance-maximum-unknown',
  severity: 'care',
  basis: COMMON_PRACTICE,
  applies: (context) =>
    fragrancesOf(context)
      .filter(({ maximum }) => maximum === null)
      .map(({ name, percentOfFats }) => ({ materials: name, percent: percentOfFats })),
};
