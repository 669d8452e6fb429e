import type { Formulary } from '../formulary/formulary.ts';
import type { BatchSize } from '../reference/shop-records.ts';
import { words } from '../words/catalogue.ts';

/** The shop's sizes that at least one formula is made at, in the shop's order. */
export function sizesInUse({ reference, formulas }: Formulary): readonly BatchSize[] {
  const used = new Set(formulas.flatMap(({ document }) => document.batches.map(({ id }) => id)));
  return reference.shop.batches.filter(({ id }) => used.has(id));
}

/** `1000 g of fats`, `48 bars of 118 g, poured weight`: what the size says of itself. */
export function sizeText({ size }: BatchSize): string {
  const text = words.frame.batchSize;
  switch (size.by) {
    case 'fats':
      return text.fats(size.mass);
    case 'batter':
      return text.batter(size.mass);
    case 'bars':
      return text.bars(size.count, size.wetMass);
    case 'mould':
      return text.mould(size.millilitres);
  }
}
