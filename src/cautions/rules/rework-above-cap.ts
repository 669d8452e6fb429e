import { COMMON_PRACTICE } from '../../reference/caution-thresholds.ts';
import type { CautionRule } from '../rule.ts';

/** A formula takes more rework than the shop allows. Silent where one of the two is not stated. */
export const rule: CautionRule<'rework-above-cap'> = {
  id: 'rework-above-cap',
  severity: 'care',
  basis: COMMON_PRACTICE,
  applies: ({ formula, reference }) => {
    const cap = reference.shop.reworkCap;
    if (formula.rework === null || cap === undefined || formula.rework <= cap) return [];
    return [{ percent: formula.rework, cap }];
  },
};
