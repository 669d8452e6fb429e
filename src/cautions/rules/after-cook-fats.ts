import { COMMON_PRACTICE } from '../../reference/caution-thresholds.ts';
import { materialNames } from '../material-names.ts';
import type { CautionRule } from '../rule.ts';

/** Fats that join after the cook always demand a check for free alkali first. */
export const rule: CautionRule<'after-cook-fats'> = {
  id: 'after-cook-fats',
  severity: 'warning',
  basis: COMMON_PRACTICE,
  applies: ({ formula, reference }) => {
    const fats = formula.afterCookFats;
    if (fats.length === 0) return [];
    return [
      {
        materials: materialNames(
          reference,
          fats.map(({ fat }) => fat),
        ),
        percent: fats.reduce((sum, { percentOfFats }) => sum + percentOfFats, 0),
      },
    ];
  },
};
