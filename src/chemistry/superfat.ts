import type { Charge } from './charge.ts';
import type { Constants } from './constants.ts';
import { type Fraction, fraction } from './quantity.ts';
import { type End, equivalentsPerGram, isBeforeSaponification, valueAt } from './saponification.ts';

/** The three amounts that decide a superfat. [mol] */
export interface Equivalents {
  readonly saponifiable: number;
  readonly acid: number;
  readonly hydroxide: number;
}

/** Which reading of the materials: the values used, or one end of every range. */
export interface Reading {
  readonly fats: End;
  readonly assay: End;
  readonly waxAsAcids: boolean;
}

export const AS_USED: Reading = { fats: 'value', assay: 'value', waxAsAcids: false };

/**
 * Equivalents of what is in the vessel while the alkali works, from masses as weighed. [mol]
 * Fat and acid of liquids that join before saponification count; after-cook fats do not.
 */
export function equivalentsOf(
  charge: Pick<Charge, 'fats' | 'alkali' | 'liquids' | 'additives'>,
  reading: Reading,
  constants: Constants,
): Equivalents {
  let saponifiable = 0;
  let acid = 0;
  let hydroxide = 0;
  for (const { fat, mass } of charge.fats) {
    saponifiable +=
      mass * equivalentsPerGram(valueAt(fat, reading.fats, reading.waxAsAcids), constants);
  }
  for (const { liquid, mass, at } of charge.liquids) {
    if (!isBeforeSaponification(at)) continue;
    acid += mass * liquid.acidity;
    if (liquid.fatData) {
      const value = valueAt(liquid.fatData, reading.fats, reading.waxAsAcids);
      saponifiable += mass * liquid.fat * equivalentsPerGram(value, constants);
    }
  }
  for (const { additive, mass, at } of charge.additives) {
    if (isBeforeSaponification(at)) acid += mass * additive.acidity;
  }
  for (const { supply, weighedMass } of charge.alkali) {
    const { low, high, value } = supply.assay;
    const assay =
      reading.assay === 'middle' ? (low + high) / 2 : { low, high, value }[reading.assay];
    hydroxide += (weighedMass * assay) / constants.hydroxide[supply.cation];
  }
  return { saponifiable, acid, hydroxide };
}

/** s = 1 - (n(OH) - n(acid)) / E. Negative where alkali is left over. [1] */
export function superfatFrom({ saponifiable, acid, hydroxide }: Equivalents): Fraction {
  return fraction(1 - (hydroxide - acid) / saponifiable);
}

/** The superfat if every acid that the alkali compensates were left out: s = 1 - n(OH) / E. [1] */
export function superfatIfAcidForgotten({ saponifiable, hydroxide }: Equivalents): Fraction {
  return fraction(1 - hydroxide / saponifiable);
}

/**
 * The superfat of the finished soap: after-cook fats and the fat of late liquids join the fat side, acids
 * added after saponification set free fatty acid from soap, which counts as unsaponified. [1]
 */
export function finalSuperfat(charge: Charge, constants: Constants): Fraction {
  const cook = equivalentsOf(charge, AS_USED, constants);
  let saponifiable = cook.saponifiable;
  let acid = cook.acid;
  for (const { fat, mass } of charge.afterCookFats) {
    saponifiable += mass * equivalentsPerGram(fat.saponificationValue.value, constants);
  }
  for (const { additive, mass, at } of charge.additives) {
    if (!isBeforeSaponification(at)) acid += mass * additive.acidity;
  }
  for (const { liquid, mass, at } of charge.liquids) {
    if (isBeforeSaponification(at)) continue;
    acid += mass * liquid.acidity;
    if (liquid.fatData) {
      const value = liquid.fatData.saponificationValue.value;
      saponifiable += mass * liquid.fat * equivalentsPerGram(value, constants);
    }
  }
  return superfatFrom({ saponifiable, acid, hydroxide: cook.hydroxide });
}
