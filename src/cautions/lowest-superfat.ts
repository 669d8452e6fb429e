import type { FormulaDocument } from '../formulary/document.ts';

/** The lowest superfat of a formula and its batches, the scale counted, and the label of the size. [%] */
export function lowestSuperfat({
  superfat,
  batches,
}: Pick<FormulaDocument, 'superfat' | 'batches'>): {
  readonly lowest: number;
  /** Empty where the formula by itself has the lowest. */
  readonly batch: string;
} {
  let lowest = superfat.expanded[0];
  let batch = '';
  for (const { label, superfat: weighed } of batches) {
    if (weighed && weighed.expanded[0] < lowest) {
      lowest = weighed.expanded[0];
      batch = label;
    }
  }
  return { lowest, batch };
}
