import type { CautionRule } from '../rule.ts';

/** Fresh batter weighs about this much; fats are lighter and lye heavier, and they nearly cancel. [g/mL] */
const BATTER_DENSITY = 1;

/** A size fills its vessel further than its process allows. Silent where the shop names no vessel. */
export const rule: CautionRule<'batch-above-vessel'> = {
  id: 'batch-above-vessel',
  severity: 'warning',
  basis: { limit: 'vessel-fill-hot' },
  applies: ({ document, reference, thresholds }) => {
    const { limits } = thresholds;
    const limit = limits[document.process === 'hot' ? 'vessel-fill-hot' : 'vessel-fill-cold'].value;
    return document.batches.flatMap(({ id, label, total }) => {
      const vessel = reference.shop.batches.find((size) => size.id === id)?.vessel;
      if (vessel === undefined || total === null) return [];
      const volume = total / BATTER_DENSITY;
      const fill = (100 * volume) / vessel;
      if (fill <= limit) return [];
      return [{ batch: label, litres: volume / 1000, vessel: vessel / 1000, fill, limit }];
    });
  },
};
