import type { FinderData } from './finder-data.ts';
import type { Limit } from './limits.ts';
import type { Sort } from './state.ts';

export interface Answer {
  /** Rows that keep every limit, in the order of the data. */
  readonly rows: readonly number[];
  /** For each limit, how many rows there would be without it. */
  readonly withoutLimit: readonly number[];
}

/** The rows that keep every limit. */
export function answer(data: FinderData, limits: readonly Limit[]): Answer {
  const rows: number[] = [];
  const broughtBack = limits.map(() => 0);
  for (const row of data.codes.keys()) {
    const failed = onlyFailure(limits, row);
    if (failed === 'none') rows.push(row);
    else if (failed !== 'several') broughtBack[failed] = (broughtBack[failed] ?? 0) + 1;
  }
  return { rows, withoutLimit: broughtBack.map((count) => rows.length + count) };
}

/** The place of the one limit that a row breaks. */
function onlyFailure(limits: readonly Limit[], row: number): number | 'none' | 'several' {
  let failed: number | 'none' = 'none';
  for (const [place, limit] of limits.entries()) {
    if (limit.holds(row)) continue;
    if (failed !== 'none') return 'several';
    failed = place;
  }
  return failed;
}

/**
 * Rows in the order asked for; rows without the number come last either way, equal ones by code. Without an order,
 * as ranked by the words, and else by code.
 */
export function inOrder(
  rows: readonly number[],
  data: FinderData,
  sort: Sort | null,
  ranked: readonly number[] | null,
): readonly number[] {
  if (!sort) {
    if (!ranked) return rows;
    const wanted = new Set(rows);
    return ranked.filter((row) => wanted.has(row));
  }
  const direction = sort.descending ? -1 : 1;
  if (sort.by === 'code') return sort.descending ? rows.toReversed() : rows;
  if (sort.by === 'name') {
    const name = (row: number) => data.names[row] ?? '';
    return rows.toSorted((a, b) => direction * compare(name(a), name(b)) || a - b);
  }
  const values = data.properties.find(({ id }) => id === sort.by)?.values ?? [];
  return rows.toSorted((a, b) => {
    const [x, y] = [values[a] ?? null, values[b] ?? null];
    if (x === null || y === null) return x === y ? a - b : x === null ? 1 : -1;
    return direction * (x - y) || a - b;
  });
}

const compare = (a: string, b: string) => (a < b ? -1 : a > b ? 1 : 0);
