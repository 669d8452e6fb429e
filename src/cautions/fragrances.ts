import type { CautionContext } from './rule.ts';

export interface FragranceDose {
  readonly name: string;
  readonly percentOfFats: number;
  /** Of the released soap, which has lost water and so holds more of it than the batter. */
  readonly percentOfProduct: number;
  /** What the supplier allows in soap. [%] */
  readonly maximum: number | null;
  /** The lowest that is stated. [degC] */
  readonly flashPoint: number | null;
}

/** The fragrances of a formula with their doses; what is listed twice counts together. */
export function fragrancesOf({ document, reference }: CautionContext): readonly FragranceDose[] {
  const masses = new Map<string, number>();
  for (const { id, mass } of document.additives) {
    if (reference.additives.get(id)?.kind === 'fragrance') {
      masses.set(id, (masses.get(id) ?? 0) + mass);
    }
  }
  const fats = document.fats.reduce((sum, { mass }) => sum + mass, 0);
  return [...masses].map(([id, mass]) => {
    const record = reference.additives.get(id);
    const lowest = (wanted: string) => {
      const stated = record?.values.find(({ name }) => name === wanted);
      return stated ? (stated.value ?? stated.min ?? stated.max) : null;
    };
    return {
      name: record?.name ?? id,
      percentOfFats: (100 * mass) / fats,
      percentOfProduct: (100 * mass) / document.yield.releasedMass,
      maximum: lowest('maximum-in-product'),
      flashPoint: lowest('flash-point'),
    };
  });
}
