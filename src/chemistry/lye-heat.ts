import type { Charge } from './charge.ts';
import type { Constants } from './constants.ts';
import { type Curve, interpolate } from './interpolate.ts';
import { lyeOf } from './lye.ts';
import { type Celsius, celsius, given, type Outcome, refused } from './quantity.ts';

/** Measured tables for one alkali, read from the reference data. Empty curves where nothing is known. */
export interface LyeHeatTables {
  /** Integral heat of solution, heat set free per mol of hydroxide, by mol water per mol hydroxide. [kJ/mol] */
  readonly heatOfSolution: Curve;
  /** What a newer data set puts on top, at all dilutions. [kJ/mol] */
  readonly newerSetAdds: number;
  /** Heat capacity sets by mass percent of hydroxide; where several cover a strength, the lowest is hottest. [J/(g K)] */
  readonly heatCapacities: readonly Curve[];
  /** Mass percent of hydroxide in a saturated solution, by temperature. [%] */
  readonly saturation: Curve;
  /** Boiling point at 1 atm by mass percent of hydroxide. [degC] */
  readonly boilingPoint: Curve;
}

export interface LyeHeat {
  /** Temperature with no heat lost, by the hotter of the data sets. */
  readonly peak: Celsius;
  /** The same by the cooler set. */
  readonly coolest: Celsius;
  /** `null` where the table ends. */
  readonly boilingPoint: Celsius | null;
}

/** H+ + OH- -> H2O(l): -285.83 + 230.0 from the formation enthalpies of water and OH-(aq). [kJ/mol] */
export const HEAT_OF_NEUTRALISATION = 55.8;

/**
 * Temperature that the lye reaches if no heat is lost, from the start temperature of alkali and water:
 * T = T0 + (n q(r) + n(acid) 55.8) / (m c), r mol of water per mol of hydroxide. [degC]
 *
 * Every acid proton in the lye counts with the full heat of a strong acid, which overstates weak acids a
 * little. Lye made from a stock solution gives only the heat of its further dilution, which is not reckoned:
 * refuses `lye-heat-of-stock`. Refuses `no-lye-heat-data` for potassium and mixed lye and
 * `lye-heat-out-of-range` where a table ends; then the strongest caution applies.
 */
export function lyeHeat(
  charge: Charge,
  start: Celsius,
  tables: Readonly<Record<'Na' | 'K', LyeHeatTables>>,
  constants: Constants,
): Outcome<LyeHeat> {
  const supply = charge.alkali[0]?.supply;
  if (!supply || charge.alkali.length > 1) return refused('no-lye-heat-data');
  const data = tables[supply.cation];
  if (data.heatOfSolution.length === 0) return refused('no-lye-heat-data');
  if (supply.form === 'solution') return refused('lye-heat-of-stock');

  const lye = lyeOf(charge);
  const hydroxide = charge.alkali.reduce((sum, { moles }) => sum + moles, 0);
  const dilution = lye.water / constants.water / hydroxide;
  const percent = 100 * lye.pureAsMade;
  const heat = interpolate(data.heatOfSolution, dilution);
  const capacities = data.heatCapacities.flatMap((curve) => interpolate(curve, percent) ?? []);
  if (heat === null || capacities.length === 0) {
    return refused('lye-heat-out-of-range', { percent, waterPerHydroxide: dilution });
  }
  let acid = 0;
  for (const { additive, mass, at } of charge.additives) {
    if (at === 'lye') acid += mass * additive.acidity;
  }
  for (const { liquid, mass, at } of charge.liquids) {
    if (at === 'lye') acid += mass * liquid.acidity;
  }
  const rise = (perMole: number, capacity: number) =>
    (1000 * (hydroxide * perMole + acid * HEAT_OF_NEUTRALISATION)) / (lye.mass * capacity);
  const boiling = interpolate(data.boilingPoint, percent);
  return given({
    peak: celsius(start + rise(heat + data.newerSetAdds, Math.min(...capacities))),
    coolest: celsius(start + rise(heat, Math.max(...capacities))),
    boilingPoint: boiling === null ? null : celsius(boiling),
  });
}
