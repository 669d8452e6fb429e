import { massIn } from './balance.ts';
import { massOfFatsFor, type Size } from './batch-size.ts';
import type { Charge, Formulation } from './charge.ts';
import type { Constants } from './constants.ts';
import { type Margin, superfatMargin } from './margin.ts';
import { type Grams, given, grams, type Outcome, refused } from './quantity.ts';
import { reckon } from './reckon.ts';
import { vesselFill } from './vessel-fill.ts';
import type { WeighedCharge } from './weigh.ts';
import { type Scales, weighSize } from './weigh-size.ts';

/** A size that the shop pours of a formula, and all that holds for sizes made as it is. */
export interface ListedSize {
  /** Fats that it takes, unrounded. [g] */
  readonly fats: Grams;
  /** Batter that stays in pots and moulds, as a fraction of what is made. */
  readonly losses: number;
  readonly scales: Scales;
  /** What its vessel holds [mL]; `null` where the shop does not say. */
  readonly vessel: number | null;
  /** The most fats at one pour [g]; `null` where the shop names none. */
  readonly heatLimit: Grams | null;
}

/** What keeps a size of one formula from being made. */
export interface SizeLimits {
  /** By rising mass of fats; at least one. */
  readonly listed: readonly ListedSize[];
  /** How far rounding may move the superfat. [1] */
  readonly largestShift: number;
  /** How full a vessel may be. [1] */
  readonly largestFill: number;
  /** Which lower end must stay at or above what. [1] */
  readonly floors: readonly { readonly end: 'expanded' | 'worstCase'; readonly floor: number }[];
}

/** A size by mass of fats, of batter, or by bars; a mould's volume is an estimate and stays with the listed ones. */
export type WantedSize = Exclude<Size, { readonly by: 'mould' }>;

/** Weights of a size that is not listed, checked against every limit. */
export interface Sized {
  readonly weighed: WeighedCharge;
  /** With the scale counted. */
  readonly margin: Margin;
  /** Place of the listed size whose scales, vessel and losses it has. */
  readonly as: number;
  /** Mass of all that is weighed. [g] */
  readonly total: number;
}

/** Only sizes by a mould's volume ask for densities. */
const NO_DENSITIES = { Na: [], K: [] };

/** Two sizes that differ by less are the same size, reckoned on two ways. */
const SAME = 1e-9;

/**
 * Weights of a formula at a size between the smallest and the largest that the shop lists for it.
 *
 * A size is made as the next larger listed one: with its scales, its vessel, its heat limit and its losses (common
 * practice, no source). Refuses `size-below-listed` and `size-above-listed`, `above-heat-limit`, `above-vessel`,
 * `lowest-superfat-below-limit`, and what `weighSize` refuses.
 */
export function anySize(
  formulation: Formulation,
  size: WantedSize,
  limits: SizeLimits,
  constants: Constants,
): Outcome<Sized> {
  const charge = reckon(formulation, grams(1000), constants);
  if (!charge.ok) return charge;
  const found = madeAs(charge.value, size, limits);
  return found.ok ? sizedAs(charge.value, size, found.value, limits, constants) : found;
}

function madeAs(charge: Charge, size: WantedSize, { listed }: SizeLimits): Outcome<number> {
  let largest = 0;
  for (const [place, { fats, losses }] of listed.entries()) {
    const wanted = massOfFatsFor(size, charge, losses, NO_DENSITIES);
    if (!wanted.ok) return wanted;
    if (place === 0 && wanted.value < fats * (1 - SAME)) {
      return refused('size-below-listed', { fats: wanted.value, smallest: fats });
    }
    if (wanted.value <= fats * (1 + SAME)) return given(place);
    largest = wanted.value;
  }
  return refused('size-above-listed', { fats: largest, largest: listed.at(-1)?.fats ?? 0 });
}

/** The same with the scales, the vessel and the losses of one listed size, whatever its own mass. */
export function sizedAs(
  charge: Charge,
  size: WantedSize,
  as: number,
  limits: SizeLimits,
  constants: Constants,
): Outcome<Sized> {
  const listed = limits.listed[as];
  if (!listed) throw new RangeError(`no listed size ${as}`);
  const { scales, losses } = listed;
  const weighing = { scales, losses, largestShift: limits.largestShift, lyeDensity: NO_DENSITIES };
  const outcome = weighSize(charge, size, weighing, constants);
  if (!outcome.ok) return outcome;
  const weighed = outcome.value;
  const found = superfatMargin(weighed.charge, constants, weighed.weighing);
  if (!found.ok) return found;
  const margin = found.value;
  const sized = { weighed, margin, as, total: massIn(weighed.charge) };
  return roomBreach(sized, listed, limits) ?? marginBreach(margin, limits) ?? given(sized);
}

function roomBreach(
  { weighed, total }: Pick<Sized, 'weighed' | 'total'>,
  { heatLimit, vessel }: ListedSize,
  { largestFill }: SizeLimits,
) {
  const fats = weighed.charge.fats.reduce((sum, { mass }) => sum + mass, 0);
  if (heatLimit !== null && fats > heatLimit) {
    return refused('above-heat-limit', { fats, limit: heatLimit });
  }
  if (vessel === null) return null;
  const fill = vesselFill(total, vessel);
  if (fill <= largestFill) return null;
  return refused('above-vessel', { fill: 100 * fill, limit: 100 * largestFill, vessel });
}

/** Refuses `lowest-superfat-below-limit` where a margin reaches below a floor. */
export function marginBreach(margin: Margin, { floors }: Pick<SizeLimits, 'floors'>) {
  for (const { end, floor } of floors) {
    const lowest = margin[end].low;
    if (lowest >= floor - SAME) continue;
    return refused('lowest-superfat-below-limit', { lowest: 100 * lowest, floor: 100 * floor });
  }
  return null;
}
