import type { FinderData, Property, Trait } from './finder-data.ts';
import { type FinderState, NO_CHOICE, type Range, withChoice, withRange } from './state.ts';

/** One condition of a search that can be dropped by itself. */
export interface Limit {
  readonly about: LimitSubject;
  readonly holds: (row: number) => boolean;
  /** What is asked when this is dropped. */
  readonly dropped: FinderState;
}

export type LimitSubject =
  | { readonly kind: 'words'; readonly words: string }
  | { readonly kind: 'range'; readonly property: Property; readonly range: Range }
  | {
      readonly kind: 'with' | 'without' | 'only' | 'any';
      readonly trait: Trait;
      /** Names of the choices. */
      readonly names: readonly string[];
    };

/** The conditions of a state. `found` are the rows that the words find; `null` where none were looked for. */
export function limitsOf(
  state: FinderState,
  data: FinderData,
  found: ReadonlySet<number> | null,
): readonly Limit[] {
  const limits: Limit[] = [];
  if (found) {
    limits.push({
      about: { kind: 'words', words: state.words },
      holds: (row) => found.has(row),
      dropped: { ...state, words: '' },
    });
  }
  for (const property of data.properties) {
    const range = state.ranges[property.id];
    if (!range) continue;
    limits.push({
      about: { kind: 'range', property, range },
      holds: (row) => isWithin(property.values[row] ?? null, range),
      dropped: withRange(state, property.id, { min: null, max: null }),
    });
  }
  return [...limits, ...data.traits.flatMap((trait) => traitLimits(state, trait))];
}

/** A formula without the number is in no range. */
export const isWithin = (value: number | null, { min, max }: Range): boolean =>
  value !== null && (min === null || value >= min) && (max === null || value <= max);

function traitLimits(state: FinderState, trait: Trait): readonly Limit[] {
  const choice = state.choices[trait.id] ?? NO_CHOICE;
  const place = (id: string) => trait.choices.findIndex((each) => each.id === id);
  const members = (row: number) => trait.members[row] ?? [];
  const limit = (
    kind: 'with' | 'without' | 'only' | 'any',
    ids: readonly string[],
    holds: (row: number, places: readonly number[]) => boolean,
  ): Limit => {
    const places = ids.map(place);
    const list = kind === 'any' ? 'with' : kind;
    const left = choice[list].filter((id) => !ids.includes(id));
    return {
      about: { kind, trait, names: places.map((each) => trait.choices[each]?.name ?? '') },
      holds: (row) => holds(row, places),
      dropped: withChoice(state, trait.id, { ...choice, [list]: left }),
    };
  };
  const hasAny = (row: number, places: readonly number[]) =>
    places.some((each) => members(row).includes(each));
  const limits = choice.without.map((id) =>
    limit('without', [id], (row, places) => !hasAny(row, places)),
  );
  if (choice.only.length > 0) {
    limits.push(
      limit('only', choice.only, (row, places) =>
        members(row).every((each) => places.includes(each)),
      ),
    );
  }
  if (trait.holds === 'many')
    return [...choice.with.map((id) => limit('with', [id], hasAny)), ...limits];
  return choice.with.length > 0 ? [limit('any', choice.with, hasAny), ...limits] : limits;
}
