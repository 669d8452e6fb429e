import type { Charge } from './charge.ts';
import { type Fraction, fraction, type Grams, grams } from './quantity.ts';

/** The lye of a charge: what is in the pot when the alkali has dissolved, and how strong it is. */
export interface Lye {
  /** Alkali as weighed (stock as dissolved hydroxide) / that and all water of the formula. */
  readonly concentration: Fraction;
  /** The same as it stands in the pot: without held-back water and liquids that join later. */
  readonly asMade: Fraction;
  /** Pure hydroxide in the pot / mass of hydroxide and water, for solubility and heat. */
  readonly pureAsMade: Fraction;
  /** Water in the pot, from all origins. [g] */
  readonly water: Grams;
  /** Everything in the pot: alkali as weighed, water to add less what is held back, liquids at the lye. [g] */
  readonly mass: Grams;
}

/** Strength of the lye of a charge. Water of additives is not counted. */
export function lyeOf(charge: Charge): Lye {
  let ruled = 0;
  let pure = 0;
  let weighed = 0;
  let stockWater = 0;
  let solidWater = 0;
  for (const { supply, pureMass, weighedMass } of charge.alkali) {
    pure += pureMass;
    weighed += weighedMass;
    if (supply.form === 'solution') {
      ruled += pureMass;
      stockWater += weighedMass - pureMass;
    } else {
      ruled += weighedMass;
      if (supply.remainder === 'water') {
        solidWater += weighedMass - pureMass - weighedMass * supply.carbonate;
      }
    }
  }
  let liquidWater = 0;
  let liquidWaterInPot = 0;
  let liquidInPot = 0;
  for (const { liquid, mass, at } of charge.liquids) {
    liquidWater += mass * liquid.water;
    if (at === 'lye') {
      liquidWaterInPot += mass * liquid.water;
      liquidInPot += mass;
    }
  }
  const all = charge.water + stockWater + liquidWater;
  const inPot = charge.water - charge.heldBack + stockWater + liquidWaterInPot;
  return {
    concentration: fraction(ruled / (ruled + all)),
    asMade: fraction(ruled / (ruled + inPot)),
    pureAsMade: fraction(pure / (pure + inPot + solidWater)),
    water: grams(inPot + solidWater),
    mass: grams(weighed + charge.water - charge.heldBack + liquidInPot),
  };
}
