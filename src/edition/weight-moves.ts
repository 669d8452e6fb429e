import type { StagedWeight, Weight, WeightsPerKilogram } from './weights-per-kilogram.ts';

/** `null`: not there. */
export interface Move {
  readonly id: string;
  readonly before: number | null;
  readonly after: number | null;
}

export interface WeightMove extends Move {
  readonly part: keyof WeightsPerKilogram;
  /** When it joins, where that is stated. */
  readonly at: string | null;
}

/** Every line of two weighings side by side, in the order of the later one, then what it no longer has. */
export function weightMoves(
  before: WeightsPerKilogram,
  after: WeightsPerKilogram,
): readonly WeightMove[] {
  const lists = (['alkali', 'fats', 'afterCookFats', 'liquids', 'additives'] as const).flatMap(
    (part) =>
      moves(before[part].map(keyed), after[part].map(keyed)).map(({ id, ...move }) => {
        const [material = id, at = null] = id.split(' ');
        return { part, id: material, at, ...move };
      }),
  );
  const water = (['water', 'heldBack'] as const)
    .map((part) => ({ part, id: part, at: null, before: before[part], after: after[part] }))
    .filter(({ part, before, after }) => part === 'water' || before !== 0 || after !== 0);
  const [alkali, rest] = [
    lists.filter(({ part }) => part === 'alkali'),
    lists.filter(({ part }) => part !== 'alkali'),
  ];
  return [...alkali, ...water, ...rest];
}

/** Something may join twice, at two times; ids hold no space. */
const keyed = (weight: Weight | StagedWeight) => ({
  id: 'at' in weight ? `${weight.id} ${weight.at}` : weight.id,
  value: weight.mass,
});

export interface Valued {
  readonly id: string;
  readonly value: number;
}

/** Two lists side by side by id, in the order of the later one, then what it no longer has. */
export function moves(before: readonly Valued[], after: readonly Valued[]): readonly Move[] {
  const valueIn = (list: readonly Valued[], wanted: string) =>
    list.find(({ id }) => id === wanted)?.value ?? null;
  const ids = new Set([...after, ...before].map(({ id }) => id));
  return [...ids].map((id) => ({ id, before: valueIn(before, id), after: valueIn(after, id) }));
}

/** Below this, two numbers differ by the arithmetic and not by the formula. */
const SAME = 1e-9;

export const hasMoved = ({ before, after }: Move) =>
  before === null || after === null || Math.abs(after - before) > SAME;
