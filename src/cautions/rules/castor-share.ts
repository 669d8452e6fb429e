import { fatShare } from '../fat-share.ts';
import type { CautionRule } from '../rule.ts';

/** More castor oil than a bar bears; pastes and liquids are sticky by nature. */
export const rule: CautionRule<'castor-share'> = {
  id: 'castor-share',
  severity: 'note',
  basis: { limit: 'castor-share' },
  applies: (context) => {
    const { limits, materials } = context.thresholds;
    const { share } = fatShare(context, ({ id }) => materials.castor.ids.includes(id));
    const limit = limits['castor-share'].value;
    return context.formula.kind === 'bar' && share > limit ? [{ share, limit }] : [];
  },
};
