/** How a value is known. `from memory` is said wherever the value is shown. */
export type How =
  | 'measured'
  | 'standard'
  | 'handbook'
  | 'supplier'
  | 'common practice'
  | 'from memory';

/** One publication or other origin of values, from `data/sources.yaml`. */
export interface Source {
  readonly id: string;
  readonly title: string;
  readonly author: string | null;
  readonly edition: string | null;
  readonly year: number | null;
  /** What sort of evidence; its place in `ORDER_OF_CHOICE` ranks it. */
  readonly kind: SourceKind;
  readonly address: string | null;
  readonly readOn: string | null;
}

/** The declared order of choice: an earlier kind is used before a later one. */
export const ORDER_OF_CHOICE = [
  'standard',
  'pharmacopoeia',
  'regulation',
  'handbook',
  'paper',
  'supplier',
  'practice',
] as const;

export type SourceKind = (typeof ORDER_OF_CHOICE)[number];

/** One value of one source. Either `value` or at least one of `min` and `max`. */
export interface ValueRecord {
  readonly value: number | null;
  readonly min: number | null;
  readonly max: number | null;
  readonly unit: string;
  readonly source: string;
  /** The place in the source: "Table 2, coconut oil". */
  readonly at: string;
  readonly how: How;
  /** `mean` of `samples` measured samples; `range` of a standard or of samples; `typical` otherwise. */
  readonly statistic: 'range' | 'mean' | 'typical';
  readonly samples: number | null;
  /** Temperature the value belongs to, where it matters. [degC] */
  readonly temperature: number | null;
  readonly note: string | null;
}

export interface CompositionRecord {
  readonly source: string;
  readonly at: string;
  readonly how: How;
  /** Percent of total fatty acids; `min` null means not stated (reckoned as 0). */
  readonly acids: readonly {
    readonly acid: string;
    readonly min: number | null;
    readonly max: number;
  }[];
  readonly note: string | null;
}
