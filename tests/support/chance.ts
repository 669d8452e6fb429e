/** Numbers that look random and are the same in every run: a linear congruential generator (Numerical Recipes). */
export interface Chance {
  /** A whole number from 0 to `below` - 1. */
  below(below: number): number;
  pick<T>(list: readonly T[]): T;
  /** Like `pick`, but early members come up far more often, as words do in a text. */
  pickEarly<T>(list: readonly T[]): T;
}

export function chance(seed: number): Chance {
  let state = seed >>> 0;
  const next = () => {
    state = (Math.imul(state, 1664525) + 1013904223) >>> 0;
    return state / 2 ** 32;
  };
  const at = <T>(list: readonly T[], place: number): T => {
    const found = list[Math.min(Math.floor(place), list.length - 1)];
    if (found === undefined) throw new RangeError('nothing to pick from');
    return found;
  };
  return {
    below: (below) => Math.floor(next() * below),
    pick: (list) => at(list, next() * list.length),
    pickEarly: (list) => at(list, list.length * next() ** 3),
  };
}
