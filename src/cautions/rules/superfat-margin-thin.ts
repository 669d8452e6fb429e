import { lowestSuperfat } from '../lowest-superfat.ts';
import type { CautionRule } from '../rule.ts';

/** The lowest superfat is not below zero, but near it. */
export const rule: CautionRule<'superfat-margin-thin'> = {
  id: 'superfat-margin-thin',
  severity: 'warning',
  basis: { limit: 'superfat-margin' },
  applies: ({ document, thresholds }) => {
    const found = lowestSuperfat(document);
    const limit = thresholds.limits['superfat-margin'].value;
    return found.lowest >= 0 && found.lowest < limit ? [{ ...found, limit }] : [];
  },
};
