/** What the finder knows of all formulas. Rows are formulas, sorted by code, by code point. */
export interface FinderData {
  readonly codes: readonly string[];
  readonly names: readonly string[];
  readonly properties: readonly Property[];
  readonly traits: readonly Trait[];
}

/** A number that every formula has or lacks. */
export interface Property {
  /** Small letters, digits and hyphens: it stands in addresses. */
  readonly id: string;
  readonly name: string;
  readonly unit: string;
  /** Under which head it stands. */
  readonly group: string;
  /** A date is counted in days since 1970-01-01. */
  readonly format: 'number' | 'date';
  readonly decimals: number;
  /** One per row, rounded as it is shown, so that a limit bites where the reader sees it bite. */
  readonly values: readonly (number | null)[];
}

/** Something that a formula is or has: its kind, its fats, its tags. */
export interface Trait {
  readonly id: string;
  readonly name: string;
  /** `one`: each formula has one, and any of those chosen will do. `many`: a formula has several. */
  readonly holds: 'one' | 'many';
  /** Whether it can be asked that a formula has nothing but the chosen. */
  readonly only: boolean;
  readonly choices: readonly { readonly id: string; readonly name: string }[];
  /** Per row, places in `choices`. */
  readonly members: readonly (readonly number[])[];
}

const DAY = 86_400_000;

/** Days since 1970-01-01 of `2026-12-01`; `null` where it is no date of the calendar. */
export function dayOf(date: string): number | null {
  if (!/^\d{4}-\d{2}-\d{2}$/.test(date)) return null;
  const milliseconds = Date.parse(`${date}T00:00:00Z`);
  if (Number.isNaN(milliseconds)) return null;
  const day = milliseconds / DAY;
  return dateOf(day) === date ? day : null;
}

/** `2026-12-01` of a number of days since 1970-01-01. */
export const dateOf = (day: number): string => new Date(day * DAY).toISOString().slice(0, 10);
