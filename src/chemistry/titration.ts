import type { Range } from './quantity.ts';

/** A back titration for the saponification value, as read at the bench (ISO 3657). */
export interface Titration {
  /** Volume of acid for the blank and for the sample. [mL] */
  readonly blank: number;
  readonly sample: number;
  /** Mass of fat. [g] */
  readonly mass: number;
  /** Concentration of the acid. [mol/L] */
  readonly normality: number;
  /** Half-widths, k = 2, of each reading, in its unit; 0 where not stated. */
  readonly uncertainty: {
    readonly volume: number;
    readonly mass: number;
    readonly normality: number;
  };
}

/** The factor printed in the standard's formula, M(KOH) rounded. [mg/mmol] */
export const STANDARD_FACTOR = 56.1;

/**
 * Saponification value SV = 56.1 c (V0 - V1) / m with its expanded uncertainty, k = 2. [mg KOH/g]
 *
 * First order (JCGM 100): both volumes, the mass and the concentration, independent. Throws a RangeError
 * where a reading is not positive or the sample took more acid than the blank.
 * @example titrate({ blank: 25.6, sample: 18.95, mass: 1.8976, normality: 1, ... }) // 196.6
 */
export function titrate(reading: Titration): Range<number> {
  const { blank, sample, mass, normality } = reading;
  const used = blank - sample;
  if (!(mass > 0 && normality > 0 && used > 0 && sample >= 0)) {
    throw new RangeError('A titration needs a positive mass, normality and blank above the sample');
  }
  const value = (STANDARD_FACTOR * normality * used) / mass;
  const { together } = expandedUncertainty(reading);
  return { value, low: value - together, high: value + together, spread: 'expanded' };
}

/**
 * Half-widths of a saponification value, k = 2, from each reading and from all together. [mg KOH/g]
 *
 * First order: dSV/dV = 56.1 c / m for either volume, SV / m for the mass, SV / c for the concentration; all
 * independent. Valid where `titrate` gives a value.
 */
export function expandedUncertainty({ blank, sample, mass, normality, uncertainty }: Titration): {
  readonly volume: number;
  readonly mass: number;
  readonly normality: number;
  readonly together: number;
} {
  const perMillilitre = (STANDARD_FACTOR * normality) / mass;
  const value = perMillilitre * (blank - sample);
  const parts = {
    volume: perMillilitre * Math.SQRT2 * uncertainty.volume,
    mass: (value * uncertainty.mass) / mass,
    normality: (value * uncertainty.normality) / normality,
  };
  return { ...parts, together: Math.hypot(parts.volume, parts.mass, parts.normality) };
}
