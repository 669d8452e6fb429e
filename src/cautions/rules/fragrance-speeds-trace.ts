import { materialNames } from '../material-names.ts';
import type { CautionRule } from '../rule.ts';

/** A fragrance that thickens a batter in cold process; a cooked soap is past that. */
export const rule: CautionRule<'fragrance-speeds-trace'> = {
  id: 'fragrance-speeds-trace',
  severity: 'care',
  basis: { materials: 'fragrance-speeds-trace' },
  applies: ({ document, thresholds, reference }) => {
    if (document.process !== 'cold') return [];
    const { ids } = thresholds.materials['fragrance-speeds-trace'];
    const found = document.additives.filter(({ id }) => ids.includes(id));
    if (found.length === 0) return [];
    return [
      {
        materials: materialNames(
          reference,
          found.map(({ id }) => id),
        ),
        percent: found.reduce((sum, { percentOfFats }) => sum + percentOfFats, 0),
      },
    ];
  },
};
