import { materialNames } from '../material-names.ts';
import type { CautionRule } from '../rule.ts';

/** A lot of alkali in use is close to its retest date, or past it. */
export const rule: CautionRule<'alkali-lot-retest'> = {
  id: 'alkali-lot-retest',
  severity: 'care',
  basis: { limit: 'alkali-retest' },
  applies: ({ document, reference, thresholds, asOf }) => {
    if (asOf === null) return [];
    return document.alkali.flatMap(({ id, assay }) => {
      const lot = reference.lots.alkalis.find(
        ({ alkali, lot }) => alkali === id && lot === assay.lot,
      );
      if (!lot) return [];
      const days = (Date.parse(lot.retestBy) - Date.parse(asOf)) / 86_400_000;
      if (days > thresholds.limits['alkali-retest'].value) return [];
      return [{ name: materialNames(reference, [id]), lot: lot.lot, retestBy: lot.retestBy, days }];
    });
  },
};
