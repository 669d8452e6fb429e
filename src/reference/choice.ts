import { ORDER_OF_CHOICE, type Source, type ValueRecord } from './values.ts';

/**
 * Place of a record in the order of choice: by the kind of its source, and among sources of one kind what was
 * read before what is known from memory. Records of one place stand as their file lists them.
 */
export function placeInOrder(
  record: { readonly source: string; readonly how: ValueRecord['how'] },
  sources: ReadonlyMap<string, Source>,
): number {
  const kind = sources.get(record.source)?.kind;
  const rank = kind === undefined ? ORDER_OF_CHOICE.length : ORDER_OF_CHOICE.indexOf(kind);
  return 2 * rank + (record.how === 'from memory' ? 1 : 0);
}

/** A range of which both ends are known. */
export type ClosedRange = ValueRecord & { readonly min: number; readonly max: number };

export const isClosedRange = (record: ValueRecord): record is ClosedRange =>
  record.min !== null && record.max !== null;

/**
 * The range that is used, from records in the order of choice: the first with both ends. What a stated number
 * of samples happened to span is narrower than nature and counts only where no other range is known.
 */
export function firstClosedRange(records: readonly ValueRecord[]): ClosedRange | null {
  const closed = records.filter(isClosedRange);
  return closed.find(({ samples }) => samples === null) ?? closed[0] ?? null;
}

/** The lowest documented mean of measured samples, where it lies below the middle of the range used. */
export function loweringMean(
  records: readonly ValueRecord[],
  { min, max }: ClosedRange,
): (ValueRecord & { readonly value: number }) | null {
  const middle = (min + max) / 2;
  return (
    records
      .filter((record): record is ValueRecord & { value: number } => record.value !== null)
      .filter(({ statistic, value }) => statistic === 'mean' && value < middle)
      .sort((a, b) => a.value - b.value)[0] ?? null
  );
}
