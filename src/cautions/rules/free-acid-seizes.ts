import { fatShare } from '../fat-share.ts';
import { materialNames } from '../material-names.ts';
import type { CautionRule } from '../rule.ts';

/** Free fatty acids react as soon as they meet the lye. */
export const rule: CautionRule<'free-acid-seizes'> = {
  id: 'free-acid-seizes',
  severity: 'care',
  basis: { limit: 'free-acid-share' },
  applies: (context) => {
    const { ids, share } = fatShare(context, ({ kind }) => kind === 'free-acid');
    const limit = context.thresholds.limits['free-acid-share'].value;
    if (share < limit) return [];
    return [{ materials: materialNames(context.reference, ids), share, limit }];
  },
};
