import { COMMON_PRACTICE } from '../../reference/caution-thresholds.ts';
import type { CautionRule } from '../rule.ts';

/** A size pours more fats than the shop lets heat up in one piece. Silent where the shop names no limit. */
export const rule: CautionRule<'batch-above-heat-limit'> = {
  id: 'batch-above-heat-limit',
  severity: 'warning',
  basis: COMMON_PRACTICE,
  applies: ({ document, reference }) =>
    document.batches.flatMap(({ id, label, massOfFats }) => {
      const limit = reference.shop.batches.find((size) => size.id === id)?.heatLimit;
      if (limit === undefined || massOfFats === null || massOfFats <= limit) return [];
      return [{ batch: label, fats: massOfFats / 1000, limit: limit / 1000 }];
    }),
};
