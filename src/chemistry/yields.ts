import type { Balance } from './balance.ts';
import type { Fraction } from './quantity.ts';

/** What a batch gives, fresh and dried to a moisture. Masses in g, shares as fractions. */
export interface Yields {
  readonly releasedMass: number;
  readonly moisture: { readonly fresh: number; readonly released: number };
  /** ISO 685 sense: fatty acids in the soap, unsaponified fat and unsaponifiable matter, per mass. */
  readonly totalFattyMatter: { readonly fresh: number; readonly released: number };
  readonly glycerolShare: { readonly fresh: number; readonly released: number };
}

/**
 * Yields of a balance. Drying takes water only, until `releaseMoisture` of what is left is water; a batch
 * that is already drier, and any paste or liquid (`releaseMoisture` null), stays as it is.
 */
export function yields(balance: Balance, releaseMoisture: Fraction | null): Yields {
  const dry = balance.total - balance.water;
  const fresh = balance.water / balance.total;
  const released =
    releaseMoisture === null || fresh <= releaseMoisture
      ? balance.total
      : dry / (1 - releaseMoisture);
  const fatty = balance.acidsInSoap + balance.unsaponifiedFat + balance.unsaponifiable;
  return {
    releasedMass: released,
    moisture: { fresh, released: 1 - dry / released },
    totalFattyMatter: { fresh: fatty / balance.total, released: fatty / released },
    glycerolShare: {
      fresh: balance.glycerol / balance.total,
      released: balance.glycerol / released,
    },
  };
}
