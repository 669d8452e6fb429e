import { COMMON_PRACTICE } from '../../reference/caution-thresholds.ts';
import { materialNames } from '../material-names.ts';
import type { CautionRule } from '../rule.ts';

/** An alkali in force is a solution. */
export const rule: CautionRule<'stock-lye'> = {
  id: 'stock-lye',
  severity: 'warning',
  basis: COMMON_PRACTICE,
  applies: ({ document, reference }) =>
    document.alkali
      .filter(({ form }) => form === 'solution')
      .map(({ id, assay }) => ({
        name: materialNames(reference, [id]),
        lot: assay.lot ?? '',
        assay: assay.value,
      })),
};
