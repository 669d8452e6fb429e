import type { FormulaDocument } from '../formulary/document.ts';

/** Positions are percent of the picture's width, so that it fits any screen without shrinking its text. */
export interface MarginPicture {
  readonly zero: number;
  readonly written: number;
  readonly expanded: readonly [number, number];
  readonly worst: readonly [number, number];
  /** The expanded interval of the trade ranges, where lots have narrowed it. */
  readonly withoutLots: readonly [number, number] | null;
  readonly ticks: readonly { readonly at: number; readonly value: number }[];
}

/**
 * Geometry of the superfat margin on one axis that always shows zero, with at least one percentage point
 * of room to either side of everything drawn.
 */
export function marginPicture({ superfat }: FormulaDocument): MarginPicture {
  const { written, expanded, worstCase } = superfat;
  const trade = superfat.withoutLots?.expanded ?? null;
  const all = [0, written, ...expanded, ...worstCase, ...(trade ?? [])];
  const low = Math.floor(Math.min(...all) - 1);
  // at least four points wide, so that there are ticks to read distances from
  const high = Math.max(low + 4, Math.ceil(Math.max(...all) + 1));
  const at = (value: number) => Number(((100 * (value - low)) / (high - low)).toFixed(3));
  const span = high - low;
  const step = span > 24 ? 5 : span > 12 ? 2 : 1;
  const ticks: { at: number; value: number }[] = [];
  for (let value = Math.ceil(low / step) * step; value <= high; value += step) {
    ticks.push({ at: at(value), value });
  }
  return {
    zero: at(0),
    written: at(written),
    expanded: [at(expanded[0]), at(expanded[1])],
    worst: [at(worstCase[0]), at(worstCase[1])],
    withoutLots: trade && [at(trade[0]), at(trade[1])],
    // a label at the very edge would be cut off
    ticks: ticks.filter((tick) => tick.at > 1 && tick.at < 99),
  };
}

/** Whether the worst case and the expanded interval stay clear of free alkali. */
export function marginVerdict({ superfat }: FormulaDocument): 'clear' | 'worst' | 'expanded' {
  if (superfat.expanded[0] < 0) return 'expanded';
  return superfat.worstCase[0] < 0 ? 'worst' : 'clear';
}
