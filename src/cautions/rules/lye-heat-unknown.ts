import { potassiumShare } from '../potassium-share.ts';
import { type CautionRule, RECKONED } from '../rule.ts';

/**
 * There is no number for the lye's heat, or none to hold it against: the strongest caution. Stock lye is
 * left out, as its alkali was dissolved before it came.
 */
export const rule: CautionRule<'lye-heat-unknown'> = {
  id: 'lye-heat-unknown',
  severity: 'danger',
  basis: RECKONED,
  applies: ({ document: { lye }, charge }) => {
    const allStock = charge.alkali.every(({ supply }) => supply.form === 'solution');
    const known = lye.peakTemperature !== null && lye.boilingPoint !== null;
    return allStock || known ? [] : [{ asMade: lye.asMade, potassium: potassiumShare(charge) }];
  },
};
