import { type CautionRule, RECKONED } from '../rule.ts';

/** The alkali allows for an acid, and would be too much without it. */
export const rule: CautionRule<'acid-forgotten'> = {
  id: 'acid-forgotten',
  severity: 'danger',
  basis: RECKONED,
  applies: ({ document }) => {
    const superfat = document.superfat.ifAcidForgotten;
    return superfat !== null && superfat < 0 ? [{ superfat }] : [];
  },
};
