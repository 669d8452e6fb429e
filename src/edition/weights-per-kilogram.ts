import { fatWeighings } from '../chemistry/blend.ts';
import type { Charge } from '../chemistry/charge.ts';
import type { FormulaDocument } from '../formulary/document.ts';

/** What is weighed for 1000 g of fats, unrounded to any scale. [g] */
export interface WeightsPerKilogram {
  readonly fats: readonly Weight[];
  readonly afterCookFats: readonly Weight[];
  readonly alkali: readonly Weight[];
  readonly water: number;
  readonly heldBack: number;
  readonly liquids: readonly StagedWeight[];
  readonly additives: readonly StagedWeight[];
}

export interface Weight {
  readonly id: string;
  readonly mass: number;
}

export interface StagedWeight extends Weight {
  readonly at: string;
}

/** Digits that a fingerprint and a record keep: finer than any scale, coarser than the last bit. */
const DIGITS = 6;

/** A number to six significant digits. */
export const sixDigits = (value: number): number => Number(value.toPrecision(DIGITS));

/** From a charge of 1000 g of fats, to six significant digits. */
export function weightsOfCharge(charge: Charge): WeightsPerKilogram {
  return {
    fats: fatWeighings(charge.fats).map(({ id, mass }) => weight(id, mass)),
    afterCookFats: charge.afterCookFats.map(({ fat, mass }) => weight(fat.id, mass)),
    alkali: charge.alkali.map(({ supply, weighedMass }) => weight(supply.id, weighedMass)),
    water: sixDigits(charge.water),
    heldBack: sixDigits(charge.heldBack),
    liquids: charge.liquids.map(({ liquid, mass, at }) => ({ ...weight(liquid.id, mass), at })),
    additives: charge.additives.map(({ additive, mass, at }) => ({
      ...weight(additive.id, mass),
      at,
    })),
  };
}

/** From a document, which holds the weights with the lots in force; to six significant digits. */
export function weightsOfDocument(document: FormulaDocument): WeightsPerKilogram {
  return {
    fats: weighingsOf(document.fats),
    afterCookFats: document.afterCookFats.map(({ id, mass }) => weight(id, mass)),
    alkali: document.alkali.map(({ id, weighedMass }) => weight(id, weighedMass)),
    water: sixDigits(document.water),
    heldBack: sixDigits(document.heldBack),
    liquids: document.liquids.map(({ id, mass, at }) => ({ ...weight(id, mass), at })),
    additives: document.additives.map(({ id, mass, at }) => ({ ...weight(id, mass), at })),
  };
}

/** Parts of one blend are one weight, under the id of the blend. */
function weighingsOf(fats: FormulaDocument['fats']): readonly Weight[] {
  const masses = new Map<string, number>();
  for (const { id, blend = id, mass } of fats) masses.set(blend, (masses.get(blend) ?? 0) + mass);
  return [...masses].map(([id, mass]) => weight(id, mass));
}

const weight = (id: string, mass: number): Weight => ({ id, mass: sixDigits(mass) });
