import type { CautionRule } from '../rule.ts';

/** Every cook can boil over. */
export const rule: CautionRule<'hot-process-boil-over'> = {
  id: 'hot-process-boil-over',
  severity: 'warning',
  basis: { limit: 'vessel-fill-hot' },
  applies: ({ formula, thresholds }) =>
    formula.process === 'hot' ? [{ fill: thresholds.limits['vessel-fill-hot'].value }] : [],
};
