import type { FatRecord } from '../reference/material-records.ts';
import type { Reference } from '../reference/reference.ts';
import type { CompositionRecord, ValueRecord } from '../reference/values.ts';
import { words } from '../words/catalogue.ts';
import { fromTo, plain } from '../words/numbers.ts';
import { recordText } from './fat-sheet.ts';
import { sourceName } from './names.ts';
import { whyCompositionUsed, whyValueUsed } from './why-used.ts';

export const MEASURES = ['saponification-value', 'iodine-value', 'density', 'composition'] as const;
export type Measure = (typeof MEASURES)[number];

/** One thing that the sources of one fat do not agree on, with every record of it. */
export interface Contradiction {
  readonly fat: FatRecord;
  readonly measure: Measure;
  /** Of a composition: which acid. */
  readonly acid: string | null;
  readonly unit: string;
  readonly records: readonly ContradictionRecord[];
}

export interface ContradictionRecord {
  readonly text: string;
  readonly source: string;
  readonly at: string;
  readonly how: string;
  readonly used: boolean;
  /** How far it lies from the record used; 0 where the two meet, `null` where none is used. */
  readonly apart: number | null;
  readonly why: string;
}

/** All contradictions of the fats: measures in their order, fats by id. Computed from the records alone. */
export function contradictions(reference: Reference): readonly Contradiction[] {
  const fats = [...reference.fats.values()];
  return MEASURES.flatMap((measure) =>
    fats.flatMap((fat) => contradictionsOf(fat, reference).filter((c) => c.measure === measure)),
  );
}

/** The contradictions of one fat. */
export function contradictionsOf(fat: FatRecord, reference: Reference): readonly Contradiction[] {
  const { chosen } = fat;
  const { sources } = reference;
  const deciding = fat.kind === 'free-acid' ? fat.acidValues : fat.saponificationValues;
  const lists = [
    ['saponification-value', deciding, chosen.saponificationValue],
    ['iodine-value', fat.iodineValues, chosen.iodineValue],
    ['density', fat.relativeDensities, chosen.density],
  ] as const;
  const values = lists.flatMap(([measure, records, used]): Contradiction[] => {
    if (!anyApart(records, used, endsOf, comparable)) return [];
    return [
      {
        fat,
        measure,
        acid: null,
        unit: records[0]?.unit === '1' ? '' : (records[0]?.unit ?? ''),
        records: records.map((record) => ({
          ...originOf(record, reference),
          text: withTemperature(record),
          used: record === used,
          apart: apartFrom(record, used),
          why:
            record === chosen.loweredBy && measure === 'saponification-value'
              ? words.contradictionsPage.lowers
              : whyValueUsed(record, used, sources),
        })),
      },
    ];
  });
  return [...values, ...compositionContradictions(fat, reference)];
}

function compositionContradictions(fat: FatRecord, reference: Reference): Contradiction[] {
  const used = fat.chosen.composition;
  const acids = [...new Set(fat.compositions.flatMap(({ acids: all }) => all.map((a) => a.acid)))];
  return acids.flatMap((acid) => {
    const rows = fat.compositions.flatMap((composition) => {
      const share = composition.acids.find((each) => each.acid === acid);
      return share ? [{ composition, min: share.min ?? 0, max: share.max }] : [];
    });
    const usedRow = rows.find(({ composition }) => composition === used) ?? null;
    if (!anyApart(rows, usedRow, (row) => row)) return [];
    return [
      {
        fat,
        measure: 'composition' as const,
        acid,
        unit: '%',
        records: rows.map((row) => ({
          ...originOf(row.composition, reference),
          text: fromTo(plain(row.min), plain(row.max)),
          used: row === usedRow,
          apart: usedRow ? gap(row, usedRow) : null,
          why: whyCompositionUsed(row.composition, used, reference.sources),
        })),
      },
    ];
  });
}

interface Ends {
  readonly min: number;
  readonly max: number;
}

/** How much room lies between two intervals; 0 where they meet. */
const gap = (a: Ends, b: Ends): number => Math.max(0, a.min - b.max, b.min - a.max);

/** A value as an interval of no width, a missing end as no limit. */
const endsOf = ({ value, min, max }: ValueRecord): Ends => ({
  min: value ?? min ?? Number.NEGATIVE_INFINITY,
  max: value ?? max ?? Number.POSITIVE_INFINITY,
});

const comparable = (a: ValueRecord, b: ValueRecord) => a.temperature === b.temperature;

/**
 * Whether any two ranges do not meet, or a single value lies outside the range used. Two single values of
 * which neither is a range differ as samples do and contradict nothing.
 */
function anyApart<T>(
  records: readonly T[],
  used: T | null,
  ends: (record: T) => Ends,
  alike: (a: T, b: T) => boolean = () => true,
): boolean {
  const isRange = (record: T) => ends(record).max > ends(record).min;
  return records.some((a) =>
    records.some(
      (b) => isRange(a) && (isRange(b) || a === used) && alike(a, b) && gap(ends(a), ends(b)) > 0,
    ),
  );
}

/** `null` also where the record used belongs to another temperature. */
const apartFrom = (record: ValueRecord, used: ValueRecord | null): number | null =>
  used && comparable(record, used) ? gap(endsOf(record), endsOf(used)) : null;

const originOf = (
  { source, at, how }: ValueRecord | CompositionRecord,
  reference: Reference,
): Pick<ContradictionRecord, 'source' | 'at' | 'how'> => ({
  source: sourceName(reference, source),
  at,
  how: words.frame.how[how],
});

function withTemperature(record: ValueRecord): string {
  const text = recordText(record);
  return record.temperature === null
    ? text
    : `${text} ${words.fatPages.atTemperature(record.temperature)}`;
}
