import { dateOf, type Property } from './finder-data.ts';

/** Rows whose values lie from `from` to below `to`. */
export interface Band {
  readonly from: number;
  readonly to: number;
  /** By value, then by row. */
  readonly rows: readonly number[];
}

const MOST_BANDS = 12;

/** The rows of a property in bands of a round width, lowest first; empty bands are left out. */
export function bandsOf(property: Property): readonly Band[] {
  const known = [...property.values.entries()].flatMap(([row, value]) =>
    value === null ? [] : [{ row, value }],
  );
  if (known.length === 0) return [];
  const values = known.map(({ value }) => value);
  const starts =
    property.format === 'date'
      ? months(Math.min(...values), Math.max(...values))
      : steps(Math.min(...values), Math.max(...values));
  return starts.slice(0, -1).flatMap((from, i) => {
    const to = starts[i + 1] ?? from;
    const rows = known
      .filter(({ value }) => value >= from && value < to)
      .toSorted((a, b) => a.value - b.value || a.row - b.row)
      .map(({ row }) => row);
    return rows.length > 0 ? [{ from, to, rows }] : [];
  });
}

/** Round limits from at or below `low` to above `high`. */
function steps(low: number, high: number): readonly number[] {
  const rough = Math.max((high - low) / MOST_BANDS, 1e-6);
  const power = Math.floor(Math.log10(rough));
  const width = [1, 2, 5, 10].find((each) => each * 10 ** power >= rough) ?? 10;
  // whole multiples of the width, so that no sum of fractions is off by a hair
  const limit = (n: number) => Number((n * width * 10 ** power).toPrecision(12));
  const limits: number[] = [];
  let n = Math.floor(low / (width * 10 ** power));
  while (limits.length === 0 || (limits.at(-1) ?? 0) <= high) limits.push(limit(n++));
  return limits;
}

/** First days of the months from that of `low` to the one after that of `high`. */
function months(low: number, high: number): readonly number[] {
  const [year = 1970, month = 1] = dateOf(low).split('-').map(Number);
  const first = (n: number) => Date.UTC(year, month - 1 + n, 1) / 86_400_000;
  const limits = [first(0)];
  while ((limits.at(-1) ?? 0) <= high) limits.push(first(limits.length));
  return limits;
}
