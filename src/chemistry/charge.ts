import type { Additive, AlkaliSupply, Fat, Liquid, Stage } from './materials.ts';
import type { Fraction, Grams, Moles } from './quantity.ts';

/** A formula as the core sees it: what goes in, in shares. All percentages are fractions here. */
export interface Formulation {
  readonly process: 'cold' | 'hot';
  /** Shares of the fats that the alkali is reckoned on; they sum to 1. */
  readonly fats: readonly {
    readonly fat: Fat;
    readonly share: Fraction;
    /** Of a part of a blend that stands ready: its id. The parts of one blend are weighed as one. */
    readonly blend?: string;
  }[];
  /** Added after the cook, mass per mass of `fats`; not counted in the alkali. */
  readonly afterCookFats: readonly { readonly fat: Fat; readonly perFats: Fraction }[];
  readonly alkali: readonly { readonly supply: AlkaliSupply; readonly share: Fraction }[];
  /** Whether the alkali shares are of hydroxide by amount or by pure mass. */
  readonly basis: 'moles' | 'mass';
  readonly superfat: Fraction;
  readonly water: WaterRule;
  /** Part of the water to add that is kept out of the lye and joins later. */
  readonly holdBack: Fraction;
  readonly liquids: readonly {
    readonly liquid: Liquid;
    /** Part of the total water that comes from this liquid's own water. */
    readonly replacesWater: Fraction;
    readonly at: Stage;
  }[];
  readonly additives: readonly {
    readonly additive: Additive;
    readonly perFats: Fraction;
    readonly at: Stage;
  }[];
}

export type WaterRule =
  /** Mass of alkali / mass of lye; solid alkali as weighed, stock as dissolved hydroxide. */
  | { readonly form: 'lye-concentration'; readonly value: Fraction }
  /** Mass of water / mass of alkali, on the same basis. */
  | { readonly form: 'per-alkali'; readonly value: number }
  /** Mass of water / mass of the fats that the alkali is reckoned on. */
  | { readonly form: 'percent-of-fats'; readonly value: Fraction };

/** Masses for a stated mass of fats, unrounded. */
export interface Charge {
  readonly formulation: Formulation;
  readonly fats: readonly { readonly fat: Fat; readonly mass: Grams; readonly blend?: string }[];
  readonly afterCookFats: readonly { readonly fat: Fat; readonly mass: Grams }[];
  readonly alkali: readonly {
    readonly supply: AlkaliSupply;
    readonly moles: Moles;
    readonly pureMass: Grams;
    readonly weighedMass: Grams;
  }[];
  /** Water to add; stock lye's own water and the water of liquids are not in it. */
  readonly water: Grams;
  /** The part of `water` that is held back. */
  readonly heldBack: Grams;
  readonly liquids: readonly {
    readonly liquid: Liquid;
    readonly mass: Grams;
    readonly at: Stage;
  }[];
  readonly additives: readonly {
    readonly additive: Additive;
    readonly mass: Grams;
    readonly at: Stage;
  }[];
}
