import type { Formulary } from '../formulary/formulary.ts';
import { decidingValue } from '../formulary/lots.ts';
import { firstClosedRange } from '../reference/choice.ts';
import type { FatRecord } from '../reference/material-records.ts';
import type { Reference } from '../reference/reference.ts';
import type { ValueRecord } from '../reference/values.ts';
import { words } from '../words/catalogue.ts';
import { fromTo, plain, range } from '../words/numbers.ts';

/** Where a fat goes in: a formula and how much of it. */
export interface FatUse {
  readonly code: string;
  readonly name: string;
  /** Percent of the fats. */
  readonly share: number;
  readonly afterCook: boolean;
}

/** Formulas that use a fat, by code. */
export function usesOf(fat: string, { formulas }: Formulary): readonly FatUse[] {
  return formulas.flatMap(({ formula }) => {
    const { code, name } = formula;
    // by itself and in blends together
    const share = formula.fats.reduce(
      (sum, each) => (each.fat === fat ? sum + each.share : sum),
      0,
    );
    return [
      ...(share > 0 ? [{ code, name, share, afterCook: false }] : []),
      ...formula.afterCookFats
        .filter((each) => each.fat === fat)
        .map(({ percentOfFats }) => ({ code, name, share: percentOfFats, afterCook: true })),
    ];
  });
}

/** Grams of pure hydroxide for 100 g of a fat, no superfat: 100 S / (1000 M(KOH)) x M. Valid where S is. */
export function alkaliPerHundred(
  saponificationValue: number,
  molarMass: { readonly KOH: number; readonly alkali: number },
): number {
  return ((100 * saponificationValue) / (1000 * molarMass.KOH)) * molarMass.alkali;
}

/** `184 to 196`, `190.4`, `at most 15`, `mean of 12: 257`. Without unit. */
export function recordText(record: ValueRecord): string {
  const { value, min, max, statistic, samples } = record;
  const text = words.fatPages;
  const decimals = [min, max].some((end) => end !== null && !Number.isInteger(end)) ? 3 : 0;
  if (value !== null) {
    return statistic === 'mean' ? `${text.mean(samples)}: ${plain(value)}` : plain(value);
  }
  if (min !== null && max !== null) {
    return decimals === 0 ? range(min, max, 0) : fromTo(plain(min), plain(max));
  }
  return max !== null ? text.atMost(max) : text.atLeast(min ?? 0);
}

export interface RecordRow {
  readonly what: string;
  readonly text: string;
  readonly unit: string;
  readonly record: ValueRecord;
  /** `used`, `lowers the value used`, or nothing. */
  readonly role: string | null;
}

/** Every published value of a fat in the order of choice, with the one that is used marked. */
export function recordRows(fat: FatRecord): readonly RecordRow[] {
  const { measures, usedHere, lowersValue } = words.fatPages;
  const { chosen } = fat;
  const lists: readonly (readonly [string, readonly ValueRecord[], ValueRecord | null])[] = [
    [measures.saponificationValue, fat.saponificationValues, chosen.saponificationValue],
    [measures.acidValue, fat.acidValues, acidValueUsed(fat)],
    [measures.iodineValue, fat.iodineValues, chosen.iodineValue],
    [measures.relativeDensity, fat.relativeDensities, chosen.density],
    [measures.unsaponifiable, fat.unsaponifiableMatter, chosen.unsaponifiable],
  ];
  return lists.flatMap(([what, records, used]) =>
    records.map((record) => ({
      what,
      record,
      text: recordText(record),
      unit: record.unit === '1' ? '' : record.unit,
      role: record === used ? usedHere : record === chosen.loweredBy ? lowersValue : null,
    })),
  );
}

/** A free acid is reckoned by its acid value; a wax's lowest superfat counts its acid value alone. */
const acidValueUsed = ({ kind, acidValues, chosen }: FatRecord): ValueRecord | null =>
  kind === 'free-acid'
    ? chosen.saponificationValue
    : kind === 'wax'
      ? firstClosedRange(acidValues)
      : null;

export interface AcidRow {
  readonly id: string;
  readonly name: string;
  /** Percent of the fatty acids that the profile is reckoned with. */
  readonly share: number;
  readonly min: number | null;
  readonly max: number | null;
}

/** The acids of a fat as used, with the published range of each; empty where no composition is known. */
export function acidRows(fat: FatRecord, { reference }: Formulary): readonly AcidRow[] {
  const published = fat.chosen.composition?.acids ?? [];
  return (fat.core?.composition ?? []).map(({ acid, share }) => {
    const ends = published.find((each) => each.acid === acid.id);
    return {
      id: acid.id,
      name: reference.acids.get(acid.id)?.name ?? acid.id,
      share: 100 * share,
      min: ends?.min ?? null,
      max: ends?.max ?? null,
    };
  });
}

/** What was measured on the released lot of a fat, a sentence each, and what it decides. */
export function lotLines({ id, kind }: FatRecord, { lots }: Reference): readonly string[] {
  const { lot: sentence, lotDecides, lotShown, lotOfWax, measures } = words.fatPages;
  const lot = lots.fats.find(({ fat, status }) => fat === id && status === 'released');
  if (!lot) return [];
  const deciding = decidingValue(lot, kind);
  const named = [
    [measures.saponificationValue, lot.saponificationValue],
    [measures.acidValue, lot.acidValue],
  ] as const;
  return named.flatMap(([measure, found]) => {
    if (!found) return [];
    const end = found === deciding ? lotDecides : kind === 'wax' ? lotOfWax : lotShown;
    return [`${sentence(lot.lot, measure, found.value, found.uncertainty, found.method)} ${end}`];
  });
}
