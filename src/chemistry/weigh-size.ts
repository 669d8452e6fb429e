import { massOfFatsFor, type Size } from './batch-size.ts';
import { fatWeighings } from './blend.ts';
import type { Charge } from './charge.ts';
import type { Constants } from './constants.ts';
import type { Curve } from './interpolate.ts';
import { type Grams, grams, type Outcome, refused } from './quantity.ts';
import { reckon } from './reckon.ts';
import { type ScaleReading, type WeighedCharge, weigh } from './weigh.ts';

/** A scale and the most that it takes. [g] */
export interface Balance extends ScaleReading {
  readonly capacity: Grams;
}

/** What a size is weighed on: a weight within the fine scale's capacity is weighed there. */
export interface Scales {
  readonly main: Balance;
  readonly fine: Balance | null;
}

/** What decides about the weights of a size besides the formula. */
export interface Weighing {
  readonly scales: Scales;
  /** Batter that stays in pots and moulds, as a fraction of what is made. */
  readonly losses: number;
  /** How far rounding may move the superfat. [1] */
  readonly largestShift: number;
  /** Density of lye, for sizes by the volume of a mould; see `batterDensity`. */
  readonly lyeDensity: Readonly<Record<'Na' | 'K', Curve>>;
}

/**
 * Weights of one size of a formula, from a charge of any size of it.
 *
 * Refuses what `massOfFatsFor`, `reckon` and `weigh` refuse, and `weight-above-scale-capacity` where one
 * weighing is more than the main scale takes.
 */
export function weighSize(
  charge: Charge,
  size: Size,
  { scales, losses, largestShift, lyeDensity }: Weighing,
  constants: Constants,
): Outcome<WeighedCharge> {
  const fats = massOfFatsFor(size, charge, losses, lyeDensity);
  if (!fats.ok) return fats;
  const scaled = reckon(charge.formulation, fats.value, constants);
  if (!scaled.ok) return scaled;
  const heaviest = heaviestWeighing(scaled.value);
  const { capacity } = scales.main;
  if (heaviest > capacity) {
    return refused('weight-above-scale-capacity', { mass: heaviest, capacity });
  }
  return weigh(scaled.value, (mass) => scaleFor(mass, scales), largestShift, constants);
}

/** The scale that a weight is weighed on. */
export const scaleFor = (mass: Grams, { main, fine }: Scales): Balance =>
  fine && mass <= fine.capacity ? fine : main;

function heaviestWeighing(charge: Charge): Grams {
  return grams(
    Math.max(
      charge.water,
      ...fatWeighings(charge.fats).map(({ mass }) => mass),
      ...charge.alkali.map(({ weighedMass }) => weighedMass),
      ...[...charge.liquids, ...charge.additives, ...charge.afterCookFats].map(({ mass }) => mass),
    ),
  );
}
