import type { CautionRule } from '../rule.ts';

/** Much unsaturated fat in cold process. */
export const rule: CautionRule<'slow-trace'> = {
  id: 'slow-trace',
  severity: 'note',
  basis: { limit: 'unsaturated-slow' },
  applies: ({ document: { process, profile }, thresholds }) => {
    if (process !== 'cold' || !profile) return [];
    const unsaturated = profile.monounsaturated + profile.polyunsaturated;
    const limit = thresholds.limits['unsaturated-slow'].value;
    return unsaturated > limit ? [{ unsaturated, limit }] : [];
  },
};
