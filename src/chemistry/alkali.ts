import type { Formulation } from './charge.ts';
import type { Constants } from './constants.ts';

/**
 * Fraction of the hydroxide, by amount, that each alkali of a formulation brings; they sum to 1.
 * With `basis: 'mass'` the shares are of pure mass and are turned into amounts by the molar masses.
 */
export function moleFractions(
  formulation: Pick<Formulation, 'alkali' | 'basis'>,
  constants: Constants,
): readonly number[] {
  const weights = formulation.alkali.map(({ supply, share }) =>
    formulation.basis === 'mass' ? share / constants.hydroxide[supply.cation] : share,
  );
  const sum = weights.reduce((a, b) => a + b, 0);
  return weights.map((weight) => weight / sum);
}

/** Per mole of hydroxide, for one formulation: what is weighed, what the water rule counts, stock's water. */
export interface AlkaliPerMole {
  readonly fractions: readonly number[];
  /** Solid as weighed plus stock as dissolved hydroxide, the mass the water rule refers to. [g/mol] */
  readonly ruled: number;
  /** All that a stock lye holds beside hydroxide, which stands in for water. [g/mol] */
  readonly stockWater: number;
}

export function alkaliPerMole(
  formulation: Pick<Formulation, 'alkali' | 'basis'>,
  constants: Constants,
): AlkaliPerMole {
  const fractions = moleFractions(formulation, constants);
  let ruled = 0;
  let stockWater = 0;
  formulation.alkali.forEach(({ supply }, index) => {
    const pure = (fractions[index] ?? 0) * constants.hydroxide[supply.cation];
    const weighed = pure / supply.assay.value;
    if (supply.form === 'solid') ruled += weighed;
    else {
      ruled += pure;
      stockWater += weighed - pure;
    }
  });
  return { fractions, ruled, stockWater };
}
