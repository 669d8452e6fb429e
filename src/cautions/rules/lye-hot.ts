import type { CautionRule } from '../rule.ts';
import { rule as nearBoiling } from './lye-heat-near-boiling.ts';

/** A lye hotter than usual, where it does not come near boiling. */
export const rule: CautionRule<'lye-hot'> = {
  id: 'lye-hot',
  severity: 'warning',
  basis: { limit: 'lye-heat' },
  applies: (context) => {
    const peak = context.document.lye.peakTemperature;
    const limit = context.thresholds.limits['lye-heat'].value;
    if (peak === null || peak < limit || nearBoiling.applies(context).length > 0) return [];
    return [{ peak, limit }];
  },
};
