import { materialNames } from '../material-names.ts';
import { type CautionRule, RECKONED } from '../rule.ts';

/** No released lot: the assay of the bag is not known. */
export const rule: CautionRule<'alkali-without-lot'> = {
  id: 'alkali-without-lot',
  severity: 'care',
  basis: RECKONED,
  applies: ({ document, reference }) =>
    document.alkali
      .filter(({ assay }) => assay.lot === undefined)
      .map(({ id, assay: { low, high, value } }) => ({
        name: materialNames(reference, [id]),
        low,
        high,
        reckoned: value,
      })),
};
