import type { Charge } from './charge.ts';
import { interpolate } from './interpolate.ts';
import { lyeOf } from './lye.ts';
import type { LyeHeatTables } from './lye-heat.ts';
import type { Cation } from './materials.ts';
import { type Celsius, celsius, type Fraction, fraction } from './quantity.ts';

type Tables = Readonly<Record<Cation, Pick<LyeHeatTables, 'saturation' | 'boilingPoint'>>>;

/**
 * Hydroxide in a saturated solution of the alkali at `temperature`, mass per mass. [1]
 *
 * Of a mixed lye the less soluble alkali, which errs on the side of crystals. `null` where a table ends.
 */
export function saturationAt(
  charge: Charge,
  temperature: Celsius,
  tables: Tables,
): Fraction | null {
  const limits = charge.alkali.map(({ supply }) =>
    interpolate(tables[supply.cation].saturation, temperature),
  );
  const known = limits.filter((limit) => limit !== null);
  if (known.length === 0 || known.length < limits.length) return null;
  return fraction(Math.min(...known) / 100);
}

/**
 * Boiling point at 1 atm of the lye as it stands in the pot. [degC]
 *
 * `null` for a mixed lye, for which no table was found, and where a table ends. Salts and sugar in the lye
 * are not counted; they raise it a little.
 */
export function lyeBoilingPoint(charge: Charge, tables: Tables): Celsius | null {
  const [only, ...others] = charge.alkali;
  if (!only || others.length > 0) return null;
  const point = interpolate(
    tables[only.supply.cation].boilingPoint,
    100 * lyeOf(charge).pureAsMade,
  );
  return point === null ? null : celsius(point);
}
