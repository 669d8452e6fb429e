import { lowestSuperfat } from '../lowest-superfat.ts';
import { type CautionRule, RECKONED } from '../rule.ts';

/** The expanded interval reaches below zero, for the formula or for one of its sizes. */
export const rule: CautionRule<'free-alkali-possible'> = {
  id: 'free-alkali-possible',
  severity: 'danger',
  basis: RECKONED,
  applies: ({ document }) => {
    const found = lowestSuperfat(document);
    return found.lowest < 0 ? [found] : [];
  },
};
