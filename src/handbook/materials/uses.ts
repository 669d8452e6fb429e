import type { ComputedFormula, Formulary } from '../../formulary/formulary.ts';
import { batchMasses } from './batch-masses.ts';

/** Where a material goes in and how much of it each batch size takes. */
export interface MaterialUse {
  readonly code: string;
  readonly name: string;
  /** Percent of the fats that the alkali is reckoned on. */
  readonly percentOfFats: number;
  /** All of it joins after the cook. */
  readonly afterCook: boolean;
  /** The sizes that have weights. [g] */
  readonly batches: readonly { readonly id: string; readonly mass: number }[];
}

/** Ids of all that a formula is made from, water left out. */
export function materialIds({ document }: ComputedFormula): ReadonlySet<string> {
  const { fats, afterCookFats, alkali, additives, liquids } = document;
  return new Set(
    [...fats, ...afterCookFats, ...alkali, ...additives, ...liquids].map(({ id }) => id),
  );
}

/** The formulas that use a material, by code. */
export function usesOfMaterial(id: string, { formulas }: Formulary): readonly MaterialUse[] {
  return formulas
    .filter((computed) => materialIds(computed).has(id))
    .map(({ document }) => {
      const { fats, afterCookFats, additives, liquids, alkali } = document;
      const whole = fats.reduce((sum, { mass }) => sum + mass, 0);
      const mass =
        [...fats, ...afterCookFats, ...additives, ...liquids]
          .filter((line) => line.id === id)
          .reduce((sum, line) => sum + line.mass, 0) +
        alkali
          .filter((line) => line.id === id)
          .reduce((sum, { weighedMass }) => sum + weighedMass, 0);
      return {
        code: document.code,
        name: document.name,
        percentOfFats: (100 * mass) / whole,
        afterCook:
          afterCookFats.some((line) => line.id === id) && !fats.some((line) => line.id === id),
        batches: document.batches.flatMap((batch) => {
          const line = batchMasses(document, batch).find((each) => each.id === id);
          return line ? [{ id: batch.id, mass: line.mass }] : [];
        }),
      };
    });
}

/** The formulas that can still be made when a material has run out, by code. */
export function makeableWithout(id: string, { formulas }: Formulary) {
  return formulas
    .filter((computed) => !materialIds(computed).has(id))
    .map(({ document: { code, name } }) => ({ code, name }));
}
