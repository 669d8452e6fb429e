import type { CautionRule } from '../rule.ts';

/** More unsaponified fat than a soap keeps well; what joins after the cook is counted. */
export const rule: CautionRule<'superfat-high'> = {
  id: 'superfat-high',
  severity: 'care',
  basis: { limit: 'superfat-high' },
  applies: ({ document, thresholds }) => {
    const superfat = Math.max(document.superfat.written, document.superfat.final);
    const limit = thresholds.limits['superfat-high'].value;
    // the written and the final one differ in their last bits where nothing joins later
    return superfat > limit + 1e-6 ? [{ superfat, limit }] : [];
  },
};
