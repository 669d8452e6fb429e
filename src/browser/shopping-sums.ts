/** What the shopping page knows: every batch with its materials, and prices where the edition has them. */
export interface ShoppingData {
  readonly materials: readonly { readonly id: string; readonly name: string }[];
  readonly batches: readonly ShoppingBatch[];
  readonly prices: {
    readonly currency: string;
    /** Per kilogram, in the order of `materials`; `null` where the shop has no price. */
    readonly perKilogram: readonly (number | null)[];
  } | null;
}

export interface ShoppingBatch {
  readonly code: string;
  readonly name: string;
  readonly size: string;
  readonly label: string;
  readonly bars: number | null;
  /** Place in `materials`, and grams. */
  readonly lines: readonly (readonly [material: number, grams: number])[];
}

/** How many of each batch, by its place in the data. */
export type Counts = ReadonlyMap<number, number>;

/** More than this of one batch is a slip of the key. */
export const MOST_BATCHES = 999;

/** What all chosen batches take together, in the order of the materials. [g] */
export function shoppingSums(
  { batches }: ShoppingData,
  counts: Counts,
): ReadonlyMap<number, number> {
  const sums = new Map<number, number>();
  for (const [place, count] of counts) {
    for (const [material, grams] of batches[place]?.lines ?? []) {
      sums.set(material, (sums.get(material) ?? 0) + count * grams);
    }
  }
  return new Map([...sums].sort(([a], [b]) => a - b));
}

/** What some materials cost, and the ones that have no price; `null` in an edition without prices. */
export function costOf(
  { prices }: Pick<ShoppingData, 'prices'>,
  lines: Iterable<readonly [material: number, grams: number]>,
): { readonly cost: number; readonly unpriced: readonly number[] } | null {
  if (!prices) return null;
  let cost = 0;
  const unpriced: number[] = [];
  for (const [material, grams] of lines) {
    const price = prices.perKilogram[material] ?? null;
    if (price === null) unpriced.push(material);
    else cost += (grams / 1000) * price;
  }
  return { cost, unpriced };
}

/** The choice as the part of an address after the `#`: `QY-014.tray=2&QY-001.pilot=1`. */
export const writeCounts = ({ batches }: ShoppingData, counts: Counts): string =>
  [...counts]
    .flatMap(([place, count]) => {
      const batch = batches[place];
      return batch && count > 0 ? [`${batch.code}.${batch.size}=${count}`] : [];
    })
    .join('&');

/** The choice of an address; what names no batch or no number is left out. */
export function readCounts({ batches }: ShoppingData, hash: string): Counts {
  const counts = new Map<number, number>();
  for (const part of hash.replace(/^#/, '').split('&')) {
    const [name, number = ''] = part.split('=');
    const place = batches.findIndex(({ code, size }) => `${code}.${size}` === name);
    const count = wholeNumber(number);
    if (place >= 0 && count > 0) counts.set(place, count);
  }
  return counts;
}

/** A whole number of batches, or 0. */
export function wholeNumber(text: string): number {
  const count = /^\d{1,3}$/.test(text.trim()) ? Number(text) : 0;
  return Math.min(count, MOST_BATCHES);
}
