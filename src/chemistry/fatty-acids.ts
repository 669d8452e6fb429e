import type { Constants } from './constants.ts';
import type { Composition } from './materials.ts';
import {
  type Fraction,
  fraction,
  type GramsPerMole,
  gramsPerMole,
  type IodineValue,
  iodineValue,
  type MgKohPerGram,
  mgKohPerGram,
} from './quantity.ts';

/**
 * Number-average molar mass of a mixture of acids given by mass: M = 1 / sum(w_k / M_k). [g/mol]
 *
 * The mass average, sum(w_k M_k), is not offered: it overstates M, on lauric oils by enough to move the
 * saponification value by about 7 mg KOH/g.
 */
export function meanMolarMass(composition: Composition): GramsPerMole {
  let share = 0;
  let molesPerGram = 0;
  for (const part of composition) {
    share += part.share;
    molesPerGram += part.share / part.acid.molarMass;
  }
  return gramsPerMole(share / molesPerGram);
}

/** Mass of fatty acids per mass of a pure triglyceride of mean acid molar mass M: 3M / (3M + 38.049). [1] */
export function fattyAcidContent(mean: GramsPerMole, constants: Constants): Fraction {
  return fraction((3 * mean) / (3 * mean + constants.glycerylResidue));
}

/**
 * Saponification value of the pure triglycerides of a composition: 3 x 1000 x M(KOH) / (3M + 38.049).
 * [mg KOH/g] Valid without free acids, partial glycerides and unsaponifiable matter (scope of
 * AOCS Cd 3a-94); multiply by one minus the unsaponifiable fraction for a real fat.
 */
export function glycerideSaponificationValue(
  composition: Composition,
  constants: Constants,
): MgKohPerGram {
  const mean = meanMolarMass(composition);
  return mgKohPerGram((3 * 1000 * constants.hydroxide.K) / (3 * mean + constants.glycerylResidue));
}

/**
 * Iodine value of the triglycerides of a composition, sum of percent times factor (AOCS Cd 1c-85,
 * ISO 3961 Annex B). [g I2/100 g] Low by calculation above 0.5 % unsaponifiable matter; not for fish oils.
 */
export function glycerideIodineValue(composition: Composition): IodineValue {
  let sum = 0;
  for (const part of composition) sum += 100 * part.share * part.acid.iodineFactor.glyceride;
  return iodineValue(sum);
}

/** The same for free fatty acids, by their own factors. [g I2/100 g] */
export function freeAcidIodineValue(composition: Composition): IodineValue {
  let sum = 0;
  for (const part of composition) sum += 100 * part.share * part.acid.iodineFactor.acid;
  return iodineValue(sum);
}

/**
 * Iodine factors from first principles, for acids that AOCS Cd 1c-85 does not list (ricinoleic):
 * 3 n M(I2) / M(triglyceride) and n M(I2) / M(acid) per percent of the acid, n double bonds.
 */
export function iodineFactors(
  molarMassOfAcid: GramsPerMole,
  doubleBonds: number,
  constants: Constants,
): { glyceride: number; acid: number } {
  const triglyceride = 3 * molarMassOfAcid + constants.glycerylResidue;
  return {
    glyceride: (3 * doubleBonds * constants.iodine) / triglyceride,
    acid: (doubleBonds * constants.iodine) / molarMassOfAcid,
  };
}
