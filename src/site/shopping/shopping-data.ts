import type { ShoppingData } from '../../browser/shopping-sums.ts';
import type { Formulary } from '../../formulary/formulary.ts';
import { batchMasses, WATER } from '../../handbook/materials/batch-masses.ts';
import { nameOf } from '../../handbook/names.ts';
import type { Prices } from '../../reference/prices-fs.ts';
import { words } from '../../words/catalogue.ts';

/**
 * Every batch that has weights, with what it takes. Materials stand as in the data: fats, alkalis, additives,
 * liquids, then water. Without prices nothing of them is in it.
 */
export function shoppingData(
  { formulas, reference }: Formulary,
  prices: Prices | null,
): ShoppingData {
  const taken = formulas.flatMap(({ document }) =>
    document.batches
      .filter(({ refused }) => !refused)
      .map((batch) => ({ document, batch, masses: batchMasses(document, batch) })),
  );
  const used = new Set(taken.flatMap(({ masses }) => masses.map(({ id }) => id)));
  const { fats, alkalis, additives, liquids } = reference;
  const ids = [...fats, ...alkalis, ...additives, ...liquids].map(([id]) => id);
  const order = [...ids, WATER].filter((id) => used.has(id));
  const places = new Map(order.map((id, place) => [id, place]));
  return {
    materials: order.map((id) => ({
      id,
      name: id === WATER ? words.shopping.water : nameOf(reference, id),
    })),
    batches: taken.map(({ document, batch, masses }) => ({
      code: document.code,
      name: document.name,
      size: batch.id,
      label: batch.label,
      bars: batch.bars,
      lines: masses
        .map(({ id, mass }) => [places.get(id) ?? 0, Number(mass.toFixed(3))] as const)
        .sort(([a], [b]) => a - b),
    })),
    prices: prices && {
      currency: prices.currency,
      perKilogram: order.map((id) => (id === WATER ? 0 : (prices.perKilogram.get(id) ?? null))),
    },
  };
}
