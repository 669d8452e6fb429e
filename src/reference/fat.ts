import type { Composition, Fat, FattyAcid } from '../chemistry/materials.ts';
import {
  fraction,
  gramsPerMillilitre,
  iodineValue,
  type MgKohPerGram,
  mgKohPerGram,
  type Range,
} from '../chemistry/quantity.ts';
import { type ClosedRange, firstClosedRange, loweringMean } from './choice.ts';
import { fatLabel } from './label.ts';
import type { FatRecord } from './material-records.ts';
import type { RawFat } from './schema/fat.ts';
import { middleOf, valueRecord } from './schema/value.ts';
import type { CompositionRecord, ValueRecord } from './values.ts';

/**
 * Density of water at 20 degC, which the relative densities of the standards refer to. [g/mL]
 * Source: CRC Handbook, from memory. Densities serve volume estimates only.
 */
const WATER_AT_20 = 0.9982;

/** A fat's file as records, with the choice made and what the core computes with. */
export function fatRecord(
  id: string,
  file: string,
  raw: RawFat,
  acids: ReadonlyMap<string, { readonly acid: FattyAcid }>,
): FatRecord {
  const records = (
    key:
      | 'saponification-value'
      | 'acid-value'
      | 'iodine-value'
      | 'relative-density'
      | 'unsaponifiable-matter',
  ) => (raw[key] ?? []).map(valueRecord);
  const saponificationValues = records('saponification-value');
  const acidValues = records('acid-value');
  const iodineValues = records('iodine-value');
  const relativeDensities = records('relative-density');
  const unsaponifiableMatter = records('unsaponifiable-matter');
  const compositions = (raw.compositions ?? []).map(
    ({ acids: shares, source, at, how, note }): CompositionRecord => ({
      source,
      at,
      how,
      note: note ?? null,
      acids: Object.entries(shares).map(([acid, { value, min, max }]) => ({
        acid,
        min: value ?? min ?? null,
        max: value ?? max ?? 0,
      })),
    }),
  );

  // the acid value of a free acid is its saponification value
  const deciding = raw.kind === 'free-acid' ? acidValues : saponificationValues;
  const saponificationValue = firstClosedRange(deciding);
  const loweredBy = saponificationValue && loweringMean(deciding, saponificationValue);
  const chosen = {
    saponificationValue,
    loweredBy,
    iodineValue: firstClosedRange(iodineValues) ?? firstMiddle(iodineValues),
    composition: compositions[0] ?? null,
    unsaponifiable: firstMiddle(unsaponifiableMatter),
    density: firstMiddle(relativeDensities),
  };
  const acidValue = firstClosedRange(acidValues);
  const iodine = chosen.iodineValue && middleOf(chosen.iodineValue);
  const density = chosen.density && middleOf(chosen.density);
  const core: Fat | null = saponificationValue && {
    id,
    kind: raw.kind,
    saponificationValue: rangeUsed(saponificationValue, loweredBy),
    acidValue: acidValue ? rangeUsed(acidValue, null) : NO_ACID,
    unsaponifiable: fraction(
      ((chosen.unsaponifiable && middleOf(chosen.unsaponifiable)) ?? 0) / 1000,
    ),
    composition: chosen.composition && pointComposition(chosen.composition, acids),
    iodineValue: iodine === null ? null : iodineValue(iodine),
    density: density === null ? null : gramsPerMillilitre(density * WATER_AT_20),
  };
  return {
    id,
    file,
    name: raw.name,
    inci: raw.inci,
    kind: raw.kind,
    origin: raw.origin,
    palm: raw.palm ?? false,
    allergens: raw.allergens ?? [],
    label: fatLabel(raw.label),
    saponificationValues,
    acidValues,
    iodineValues,
    relativeDensities,
    unsaponifiableMatter,
    compositions,
    notes: raw.notes ?? [],
    chosen,
    core,
  };
}

const NO_ACID: Range<MgKohPerGram> = {
  value: mgKohPerGram(0),
  low: mgKohPerGram(0),
  high: mgKohPerGram(0),
};

/** The lower of the middle and a documented mean, but never below the range. */
function rangeUsed(
  { min, max }: ClosedRange,
  loweredBy: (ValueRecord & { readonly value: number }) | null,
): Range<MgKohPerGram> {
  const value = loweredBy ? Math.max(min, loweredBy.value) : (min + max) / 2;
  return { value: mgKohPerGram(value), low: mgKohPerGram(min), high: mgKohPerGram(max) };
}

const firstMiddle = (records: readonly ValueRecord[]): ValueRecord | null =>
  records.find((record) => middleOf(record) !== null) ?? null;

/** Middles of the ranges, an absent lower end 0, as parts of their sum. `null` where an acid is not known. */
export function pointComposition(
  { acids: shares }: CompositionRecord,
  acids: ReadonlyMap<string, { readonly acid: FattyAcid }>,
): Composition | null {
  const sum = sumOfMiddles(shares);
  if (sum === 0) return null;
  const parts = shares.flatMap((share) => {
    const acid = acids.get(share.acid)?.acid;
    return acid ? [{ acid, share: fraction(middle(share) / sum) }] : [];
  });
  return parts.length === shares.length ? parts : null;
}

const middle = ({ min, max }: { readonly min: number | null; readonly max: number }) =>
  ((min ?? 0) + max) / 2;

/** Percent of the fatty acids that the middles account for. */
export const sumOfMiddles = (shares: CompositionRecord['acids']): number =>
  shares.reduce((sum, share) => sum + middle(share), 0);
