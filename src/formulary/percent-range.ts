/** A core interval of fractions as the percents of a document. */
export const percentRange = (range: {
  readonly low: number;
  readonly high: number;
}): readonly [number, number] => [range.low * 100, range.high * 100];
