import type { FormulaDocument } from '../formulary/document.ts';
import type { Reference } from '../reference/reference.ts';
import { words } from '../words/catalogue.ts';

export interface BatchYield {
  readonly label: string;
  readonly batter: string;
  readonly poured: string;
  /** Whole bars at each poured weight that the shop states; empty for pastes and liquids. */
  readonly bars: readonly string[];
  readonly released: string;
  readonly loss: string;
}

/** What each size with weights gives, by the weights as rounded; sizes without weights are left out. */
export function batchYields(
  document: FormulaDocument,
  reference: Reference,
): readonly BatchYield[] {
  const text = words.yieldWords;
  return document.batches.flatMap((batch) => {
    const given = batch.yield;
    if (given === null || batch.total === null) return [];
    const lost = given.poured - given.releasedMass;
    return [
      {
        label: batch.label,
        batter: text.grams(batch.total),
        poured: text.grams(given.poured),
        bars:
          document.kind === 'bar'
            ? barsOf(batch.id, given.poured, reference).map(({ count, wetMass }) =>
                text.bars(count, wetMass),
              )
            : [],
        released: text.grams(given.releasedMass),
        loss: text.gramsAndShare(lost, (100 * lost) / given.poured),
      },
    ];
  });
}

/** Poured weights of a bar that the shop's sizes state, each once, lightest first. [g] */
export function wetMassesOf({ shop }: Reference): readonly number[] {
  const stated = shop.batches.flatMap(({ size }) => (size.by === 'bars' ? [size.wetMass] : []));
  return [...new Set(stated)].sort((a, b) => a - b);
}

/** Of a size by bars its own count; of any other the whole bars that what is poured fills. */
export function barsOf(
  batch: string,
  poured: number,
  reference: Reference,
): readonly { readonly count: number; readonly wetMass: number }[] {
  const size = reference.shop.batches.find(({ id }) => id === batch)?.size;
  if (size?.by === 'bars') return [{ count: size.count, wetMass: size.wetMass }];
  return wetMassesOf(reference).map((wetMass) => ({
    count: Math.floor(poured / wetMass),
    wetMass,
  }));
}
