import { fatShare } from '../fat-share.ts';
import { materialNames } from '../material-names.ts';
import type { CautionRule } from '../rule.ts';

/** Fats that shorten the time to trace, in cold process. */
export const rule: CautionRule<'fast-trace'> = {
  id: 'fast-trace',
  severity: 'note',
  basis: { limit: 'fast-trace-share' },
  applies: (context) => {
    const { limits, materials } = context.thresholds;
    const { ids, share } = fatShare(context, ({ id }) => materials['fast-trace'].ids.includes(id));
    const limit = limits['fast-trace-share'].value;
    if (context.formula.process !== 'cold' || share < limit) return [];
    return [{ materials: materialNames(context.reference, ids), share, limit }];
  },
};
