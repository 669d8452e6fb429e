import type { Chance } from '../support/chance.ts';
import { EDGES, MISFITS, PAYLOADS } from './hostile-values.ts';

type Keyed = Record<string, unknown>;
const isKeyed = (value: unknown): value is Keyed =>
  typeof value === 'object' && value !== null && !Array.isArray(value);

/** A list or keys, and the place in it that is to be changed. */
interface Spot {
  readonly holder: unknown[] | Keyed;
  readonly key: string | number;
}

/**
 * Changes a parsed file in one to `most` places, in place: a value for another, a key too many, missing or moved, two
 * ids swapped, one entry many times. `ids` are names that mean something elsewhere in the data.
 */
export function mutateValue(root: unknown, random: Chance, ids: readonly string[], most = 3): void {
  for (let left = 1 + random.below(most); left > 0; left--) {
    const spots = spotsIn(root);
    if (spots.length === 0) return;
    change(random.pick(spots), spots, random, ids);
  }
}

function spotsIn(value: unknown, found: Spot[] = []): readonly Spot[] {
  if (Array.isArray(value)) {
    for (const [key, inner] of value.entries()) {
      found.push({ holder: value, key });
      spotsIn(inner, found);
    }
  } else if (isKeyed(value)) {
    for (const [key, inner] of Object.entries(value)) {
      found.push({ holder: value, key });
      spotsIn(inner, found);
    }
  }
  return found;
}

function change(
  { holder, key }: Spot,
  spots: readonly Spot[],
  random: Chance,
  ids: readonly string[],
): void {
  const at = holder as Record<string | number, unknown>;
  const value = at[key];
  const nudge = random.pick([0, 0.5, 0.99, 1.01, 2, 10, -1]);
  const other = random.pick(spots);
  const ways: readonly (() => void)[] = [
    // what is nearly right gets furthest
    () => {
      at[key] = typeof value === 'number' ? value * nudge : random.pick(ids);
    },
    () => {
      at[key] = typeof value === 'string' ? random.pick(ids) : random.pick(EDGES);
    },
    () => {
      at[key] = random.pick(PAYLOADS);
    },
    () => {
      at[key] = typeof value === 'string' ? `${value} ${random.pick(PAYLOADS)}` : value;
    },
    () => {
      at[key] = random.pick(EDGES);
    },
    () => {
      at[key] = structuredClone(random.pick(MISFITS));
    },
    () => {
      if (Array.isArray(holder)) holder.splice(Number(key), 1);
      else delete holder[key];
    },
    () => {
      if (Array.isArray(holder)) holder.push(structuredClone(value));
      else holder[random.pick(PAYLOADS)] = structuredClone(value);
    },
    () => {
      at[key] = nested(value, random.pick([1, 5, 80]));
    },
    () => {
      const there = other.holder as Record<string | number, unknown>;
      at[key] = structuredClone(there[other.key]);
    },
  ];
  random.pick(ways)();
}

function nested(value: unknown, depth: number): unknown {
  let inner = structuredClone(value);
  for (let i = 0; i < depth; i++) inner = i % 2 === 0 ? [inner] : { a: inner };
  return inner;
}
