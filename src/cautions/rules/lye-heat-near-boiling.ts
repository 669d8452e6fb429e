import { type CautionRule, RECKONED } from '../rule.ts';

/** The lye, with no heat lost, comes near its own boiling point. */
export const rule: CautionRule<'lye-heat-near-boiling'> = {
  id: 'lye-heat-near-boiling',
  severity: 'danger',
  basis: RECKONED,
  applies: ({ document: { lye }, thresholds }) => {
    const { peakTemperature: peak, boilingPoint: boiling } = lye;
    const margin = thresholds.limits['lye-boiling-margin'].value;
    if (peak === null || boiling === null || peak < boiling - margin) return [];
    return [{ peak, boiling, margin }];
  },
};
