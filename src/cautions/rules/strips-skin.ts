import type { CautionRule } from '../rule.ts';

/** Much lauric and myristic acid. */
export const rule: CautionRule<'strips-skin'> = {
  id: 'strips-skin',
  severity: 'care',
  basis: { limit: 'lauric-and-myristic' },
  applies: ({ document: { profile, superfat }, thresholds }) => {
    if (!profile) return [];
    const share = (profile.acids['C12:0'] ?? 0) + (profile.acids['C14:0'] ?? 0);
    const limit = thresholds.limits['lauric-and-myristic'].value;
    return share > limit ? [{ share, limit, superfat: superfat.final }] : [];
  },
};
