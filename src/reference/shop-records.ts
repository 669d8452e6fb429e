import type { Grams } from '../chemistry/quantity.ts';
import type { UnitSystem } from '../words/units.ts';

export interface Scale {
  readonly id: string;
  readonly name: string;
  readonly step: Grams;
  /** Largest error of one weighing, half-width. */
  readonly error: Grams;
  /** Largest net weight it takes, in the heaviest vessel that is used on it. */
  readonly capacity: Grams;
}

/** A size the shop pours. Exactly one of the four ways to state it. */
export interface BatchSize {
  readonly id: string;
  readonly label: string;
  readonly size:
    | { readonly by: 'fats'; readonly mass: Grams }
    | { readonly by: 'batter'; readonly mass: Grams }
    | { readonly by: 'bars'; readonly count: number; readonly wetMass: Grams }
    | { readonly by: 'mould'; readonly millilitres: number };
  /** Batter that stays in pots and moulds, as a fraction of what is made. */
  readonly losses: number;
  /** Scale ids; a weight within the fine scale's capacity is weighed there. */
  readonly scale: string;
  readonly fineScale: string | null;
  readonly kinds: readonly ('bar' | 'paste' | 'liquid')[];
  /** What the vessel holds in which this size is mixed or cooked, where the shop states it. [mL] */
  readonly vessel?: number;
  /** The most fats that the shop makes at one pour of this size, as more cannot lose its heat. */
  readonly heatLimit?: Grams;
}

export interface Shop {
  readonly name: string;
  readonly invented: boolean;
  /** What its scales show and its sheets print. */
  readonly units: UnitSystem;
  /** Where the handbook is served, with a slash at its end; `null` where it has no address. */
  readonly siteAddress: string | null;
  readonly batches: readonly BatchSize[];
  readonly scales: readonly Scale[];
  /** Lye water and fats start from here. [degC] */
  readonly startTemperature: number;
  /** Water left in a released bar, percent by mass. */
  readonly releaseMoisture: number;
  /** How far rounding may move the superfat before a size is too small for the scale. [percentage points] */
  readonly largestSuperfatShift: number;
  /** Soap made before that the shop works into a batch at most, where it states it. [percent of the batter] */
  readonly reworkCap?: number;
  /** Formula pages reckon sizes between the listed ones, and help when something was weighed wrong. */
  readonly anySize?: boolean;
  readonly emergency: readonly { readonly label: string; readonly value: string }[];
  readonly rules: readonly string[];
  readonly releaseLimits: readonly ReleaseLimit[];
}

/** Which end of which interval must stay at or above which floor, for which formulas. The last match wins. */
export interface ReleaseLimit {
  readonly kind: 'bar' | 'paste' | 'liquid' | 'any';
  readonly process: 'cold' | 'hot' | 'any';
  readonly end: 'expanded' | 'worst-case';
  /** Percent superfat. */
  readonly floor: number;
}

/** Fats that the shop keeps mixed and weighs as one. */
export interface Blend {
  readonly id: string;
  readonly name: string;
  /** Percent by mass of the blend; they sum to 100. */
  readonly parts: readonly { readonly fat: string; readonly share: number }[];
  readonly notes: readonly string[];
}
