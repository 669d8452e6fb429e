import { COMMON_PRACTICE } from '../../reference/caution-thresholds.ts';
import { potassiumShare } from '../potassium-share.ts';
import type { CautionRule } from '../rule.ts';

/** Potassium hydroxide behaves otherwise than the alkali that most makers know. */
export const rule: CautionRule<'potassium-lye'> = {
  id: 'potassium-lye',
  severity: 'warning',
  basis: COMMON_PRACTICE,
  applies: ({ charge }) => {
    const potassium = potassiumShare(charge);
    return potassium > 0 ? [{ potassium }] : [];
  },
};
