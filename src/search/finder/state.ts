import type { PageType } from './page-types.ts';

/** What was asked: all of it stands in the address, so that it can be kept and sent. */
export interface FinderState {
  readonly words: string;
  /** Of which type the pages are that are listed for the words; `null` for all. */
  readonly where: PageType | null;
  /** By property. */
  readonly ranges: Readonly<Record<string, Range>>;
  /** By trait. */
  readonly choices: Readonly<Record<string, Choice>>;
  /** Properties shown as columns; `null` leaves it to the page. */
  readonly columns: readonly string[] | null;
  readonly sort: Sort | null;
}

/** Either end may be open. */
export interface Range {
  readonly min: number | null;
  readonly max: number | null;
}

/** Ids of choices. */
export interface Choice {
  readonly with: readonly string[];
  readonly without: readonly string[];
  /** Nothing but these; empty asks nothing. */
  readonly only: readonly string[];
}

export interface Sort {
  /** A property, or `code` or `name`. */
  readonly by: string;
  readonly descending: boolean;
}

export const NOTHING_ASKED: FinderState = {
  words: '',
  where: null,
  ranges: {},
  choices: {},
  columns: null,
  sort: null,
};

export const NO_CHOICE: Choice = { with: [], without: [], only: [] };

/** The state with another range for a property; a range open at both ends is taken out. */
export function withRange(state: FinderState, property: string, range: Range): FinderState {
  const { [property]: _, ...others } = state.ranges;
  const open = range.min === null && range.max === null;
  return { ...state, ranges: open ? others : { ...others, [property]: range } };
}

/** The state with another choice for a trait; an empty choice is taken out. */
export function withChoice(state: FinderState, trait: string, choice: Choice): FinderState {
  const { [trait]: _, ...others } = state.choices;
  const empty = choice.with.length + choice.without.length + choice.only.length === 0;
  return { ...state, choices: empty ? others : { ...others, [trait]: choice } };
}
