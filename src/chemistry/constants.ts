import type { Cation } from './materials.ts';
import { type AtomicWeights, molarMass } from './molar-mass.ts';
import type { GramsPerMole } from './quantity.ts';

/** Molar masses that every model needs, all derived from the atomic weights. */
export interface Constants {
  readonly water: GramsPerMole;
  readonly glycerol: GramsPerMole;
  readonly hydrogen: GramsPerMole;
  readonly iodine: GramsPerMole;
  readonly hydroxide: Readonly<Record<Cation, GramsPerMole>>;
  readonly metal: Readonly<Record<Cation, GramsPerMole>>;
  readonly carbonate: Readonly<Record<Cation, GramsPerMole>>;
  /** Glycerol less the three waters that its esters lost: what a triglyceride has beside its acids. */
  readonly glycerylResidue: GramsPerMole;
}

/** Throws a RangeError where one of H, C, O, Na, K, I is missing. */
export function constantsFrom(weights: AtomicWeights): Constants {
  const of = (formula: string) => molarMass(formula, weights);
  const water = of('H2O');
  const glycerol = of('C3H8O3');
  return {
    water,
    glycerol,
    hydrogen: of('H'),
    iodine: of('I2'),
    hydroxide: { Na: of('NaOH'), K: of('KOH') },
    metal: { Na: of('Na'), K: of('K') },
    carbonate: { Na: of('Na2CO3'), K: of('K2CO3') },
    glycerylResidue: (glycerol - 3 * water) as GramsPerMole,
  };
}
