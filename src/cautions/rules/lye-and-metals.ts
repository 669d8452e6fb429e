import { COMMON_PRACTICE } from '../../reference/caution-thresholds.ts';
import type { CautionRule } from '../rule.ts';

/** Holds for every lye, so it stands behind what is special about a formula. */
export const rule: CautionRule<'lye-and-metals'> = {
  id: 'lye-and-metals',
  severity: 'care',
  basis: COMMON_PRACTICE,
  applies: ({ document }) => [{ concentration: document.lye.asMade }],
};
