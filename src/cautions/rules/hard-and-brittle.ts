import type { CautionRule } from '../rule.ts';

/** A bar of mostly lauric fats. */
export const rule: CautionRule<'hard-and-brittle'> = {
  id: 'hard-and-brittle',
  severity: 'note',
  basis: { limit: 'lauric' },
  applies: ({ document: { kind, profile }, thresholds }) => {
    const lauric = profile?.acids['C12:0'] ?? 0;
    const limit = thresholds.limits.lauric.value;
    return kind === 'bar' && lauric > limit ? [{ lauric, limit }] : [];
  },
};
