import { batterVolume, vesselFill } from '../../chemistry/vessel-fill.ts';
import type { CautionRule } from '../rule.ts';
import { vesselFillLimit } from '../vessel-fill-limit.ts';

/** A size fills its vessel further than its process allows. Silent where the shop names no vessel. */
export const rule: CautionRule<'batch-above-vessel'> = {
  id: 'batch-above-vessel',
  severity: 'warning',
  basis: { limit: 'vessel-fill-hot' },
  applies: ({ document, reference, thresholds }) => {
    const limit = vesselFillLimit(document.process, thresholds);
    return document.batches.flatMap(({ id, label, total }) => {
      const vessel = reference.shop.batches.find((size) => size.id === id)?.vessel;
      if (vessel === undefined || total === null) return [];
      const fill = 100 * vesselFill(total, vessel);
      if (fill <= limit) return [];
      const litres = batterVolume(total) / 1000;
      return [{ batch: label, litres, vessel: vessel / 1000, fill, limit }];
    });
  },
};
