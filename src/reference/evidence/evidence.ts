import type { How } from '../values.ts';

/** What a computed number is held against. */
export interface Published {
  readonly value: number | null;
  readonly min: number | null;
  readonly max: number | null;
}

/** One line of the evidence table: computed against published. */
export interface EvidenceRow {
  /** Permanent id; a known disagreement names it. */
  readonly id: string;
  readonly group: EvidenceGroup;
  readonly subject: string;
  readonly computed: number;
  readonly published: Published;
  readonly unit: string;
  /** How far outside the published value or range the computed one may lie. */
  readonly tolerance: number;
  /** Distance from the published value, or from the nearer end of a range it lies outside of. */
  readonly deviation: number;
  readonly agrees: boolean;
  readonly source: string;
  readonly at: string;
  readonly how: How;
  readonly note: string | null;
  /** Why a row that does not agree is known not to; `null` where it agrees or nobody knows. */
  readonly disagreement: string | null;
}

/** In the order of the page. */
export const EVIDENCE_GROUPS = [
  'molar-mass',
  'equivalent-1908',
  'iodine-factor',
  'titration',
  'saponification-value',
  'iodine-value',
  'acid-share',
  'glycerol',
  'wax',
  'lye-density',
  'lye-heat',
] as const;
export type EvidenceGroup = (typeof EVIDENCE_GROUPS)[number];

/** Signed distance of a computed number from what was published; 0 inside a range. */
export function deviationFrom(computed: number, { value, min, max }: Published): number {
  if (value !== null) return computed - value;
  if (min !== null && computed < min) return computed - min;
  if (max !== null && computed > max) return computed - max;
  return 0;
}

/** Puts a row together, judged. */
export function judged(
  row: Omit<EvidenceRow, 'deviation' | 'agrees' | 'disagreement'>,
  disagreements: ReadonlyMap<string, string>,
): EvidenceRow {
  const deviation = deviationFrom(row.computed, row.published);
  const agrees = Math.abs(deviation) <= row.tolerance;
  return {
    ...row,
    deviation,
    agrees,
    disagreement: agrees ? null : (disagreements.get(row.id) ?? null),
  };
}
