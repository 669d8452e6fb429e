import { type CautionRule, RECKONED } from '../rule.ts';

/** Held-back water, or liquids that join later, leave a stronger lye in the jug. */
export const rule: CautionRule<'lye-stronger-than-written'> = {
  id: 'lye-stronger-than-written',
  severity: 'warning',
  basis: RECKONED,
  applies: ({ document: { lye }, thresholds }) => {
    const limit = thresholds.limits['lye-strengthened'].value;
    const { asMade, concentration: written } = lye;
    return asMade - written >= limit ? [{ asMade, written, limit }] : [];
  },
};
