import { fatShare } from '../fat-share.ts';
import type { CautionRule } from '../rule.ts';

/** More low-erucic rapeseed oil than the trade's rule. */
export const rule: CautionRule<'rapeseed-share'> = {
  id: 'rapeseed-share',
  severity: 'care',
  basis: { limit: 'rapeseed-share' },
  applies: (context) => {
    const { limits, materials } = context.thresholds;
    const ids = materials['low-erucic-rapeseed'].ids;
    const { share } = fatShare(context, ({ id }) => ids.includes(id));
    const limit = limits['rapeseed-share'].value;
    return share > limit ? [{ share, limit, most: limits['rapeseed-share-most'].value }] : [];
  },
};
