import { COMMON_PRACTICE } from '../../reference/caution-thresholds.ts';
import { fatShare } from '../fat-share.ts';
import { materialNames } from '../material-names.ts';
import type { CautionRule } from '../rule.ts';

/** Wax esters may not react without a cook. */
export const rule: CautionRule<'wax-in-cold-process'> = {
  id: 'wax-in-cold-process',
  severity: 'warning',
  basis: COMMON_PRACTICE,
  applies: (context) => {
    const { ids, share } = fatShare(context, ({ kind }) => kind === 'wax');
    if (context.formula.process !== 'cold' || share === 0) return [];
    return [{ materials: materialNames(context.reference, ids), share }];
  },
};
