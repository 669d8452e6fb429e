import { materialNames } from '../material-names.ts';
import type { CautionRule } from '../rule.ts';

/** A salt bar. */
export const rule: CautionRule<'salt-sets-fast'> = {
  id: 'salt-sets-fast',
  severity: 'care',
  basis: { limit: 'salt-share' },
  applies: ({ formula, reference, thresholds }) => {
    const salts = formula.additives.filter(({ additive }) =>
      thresholds.materials['setting-salts'].ids.includes(additive),
    );
    const percent = salts.reduce((sum, { percentOfFats }) => sum + percentOfFats, 0);
    const limit = thresholds.limits['salt-share'].value;
    if (formula.kind !== 'bar' || percent < limit) return [];
    const ids = salts.map(({ additive }) => additive);
    return [{ materials: materialNames(reference, ids), percent, limit }];
  },
};
