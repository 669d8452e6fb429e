import { type GramsPerMole, gramsPerMole } from './quantity.ts';

/** Standard atomic weights by symbol. [g/mol] */
export type AtomicWeights = ReadonlyMap<string, number>;

/**
 * Molar mass of a molecular formula without brackets, `C18H34O2`: the sum of the atomic weights. [g/mol]
 *
 * Throws a RangeError that names the symbol where an element has no weight, and the formula where it
 * cannot be read; both are mistakes in the data, not in a user's formula.
 * @example molarMass('NaOH', weights) // 39.997 with H 1.008, O 15.999, Na 22.990
 */
export function molarMass(formula: string, weights: AtomicWeights): GramsPerMole {
  if (!/^([A-Z][a-z]?[0-9]*)+$/.test(formula)) {
    throw new RangeError(`Cannot read the molecular formula "${formula}"`);
  }
  let sum = 0;
  for (const [, symbol = '', count] of formula.matchAll(/([A-Z][a-z]?)([0-9]*)/g)) {
    const weight = weights.get(symbol);
    if (weight === undefined) throw new RangeError(`No atomic weight for "${symbol}"`);
    sum += weight * (count ? Number(count) : 1);
  }
  return gramsPerMole(sum);
}
