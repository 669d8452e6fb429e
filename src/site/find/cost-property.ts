import { costOf } from '../../browser/shopping-sums.ts';
import type { ComputedFormula, Formulary } from '../../formulary/formulary.ts';
import { batchMasses, WATER } from '../../handbook/materials/batch-masses.ts';
import type { Prices } from '../../reference/prices-fs.ts';
import type { Property } from '../../search/finder/finder-data.ts';
import { words } from '../../words/catalogue.ts';
import { priceOf } from '../../words/measures.ts';

const DECIMALS = 2;

/**
 * What the materials of a kilogram of batter, or a pound, cost at the first size that has weights. A formula with
 * a material that has no price has no number, never a part of one.
 */
export function costProperty({ formulas }: Formulary, prices: Prices): Property {
  const { group, name, unit } = words.findCost;
  return {
    id: 'cost',
    name,
    unit: unit(prices.currency),
    group,
    format: 'number',
    decimals: DECIMALS,
    values: formulas.map((computed) => costOfBatter(computed, prices)),
  };
}

function costOfBatter({ document }: ComputedFormula, prices: Prices): number | null {
  const batch = document.batches.find(({ refused }) => !refused);
  if (!batch) return null;
  const masses = batchMasses(document, batch);
  const priced = costOf(
    {
      prices: {
        currency: prices.currency,
        perKilogram: masses.map(({ id }) =>
          id === WATER ? 0 : (prices.perKilogram.get(id) ?? null),
        ),
      },
    },
    masses.map(({ mass }, place) => [place, mass] as const),
  );
  const whole = masses.reduce((sum, { mass }) => sum + mass, 0) / 1000;
  if (!priced || priced.unpriced.length > 0 || whole === 0) return null;
  return Number(priceOf(priced.cost / whole).toFixed(DECIMALS));
}
