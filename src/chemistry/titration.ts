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
  const { blank, sample, mass, normality, uncertainty } = reading;
  const used = blank - sample;
  if (!(mass > 0 && normality > 0 && used > 0 && sample >= 0)) {
    throw new RangeError('A titration needs a positive mass, normality and blank above the sample');
  }
  const value = (STANDARD_FACTOR * normality * used) / mass;
  const relative = Math.hypot(
    (Math.SQRT2 * uncertainty.volume) / used,
    uncertainty.mass / mass,
    uncertainty.normality / normality,
  );
  return {
    value,
    low: value * (1 - relative),
    high: value * (1 + relative),
    spread: 'expanded',
  };
}
