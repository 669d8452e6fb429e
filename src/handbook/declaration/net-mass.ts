import type { FormulaDocument } from '../../formulary/document.ts';
import type { Shop } from '../../reference/shop-records.ts';
import { OUNCE } from '../../words/units.ts';

export interface NetMass {
  readonly label: string;
  /** Poured, one bar. [g] */
  readonly wet: number;
  /** The same when only its water is gone, down to the release moisture. [g] */
  readonly released: number;
  readonly ounces: number;
  /** Percent. */
  readonly moisture: number;
}

/** Reckoned mass of one bar at release, for each size that is poured by bars. An estimate: the label follows the scale. */
export function netMasses(
  { batches, yield: yields }: FormulaDocument,
  shop: Shop,
): readonly NetMass[] {
  return batches.flatMap(({ id, label, refused }) => {
    const size = shop.batches.find((batch) => batch.id === id)?.size;
    if (refused || size?.by !== 'bars') return [];
    const released = (size.wetMass * yields.releasedMass) / yields.total;
    return [
      {
        label,
        wet: size.wetMass,
        released,
        ounces: released / OUNCE,
        moisture: yields.moisture.released,
      },
    ];
  });
}
