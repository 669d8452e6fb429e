import {
  freeAcidIodineValue,
  glycerideIodineValue,
  glycerideSaponificationValue,
  meanMolarMass,
} from '../../chemistry/fatty-acids.ts';
import type { Fat } from '../../chemistry/materials.ts';
import type { FatRecord } from '../material-records.ts';
import type { Reference } from '../reference.ts';
import type { ValueRecord } from '../values.ts';
import { type EvidenceRow, judged } from './evidence.ts';

/** Beyond a published range of another source than the composition's: 1 % of its middle. */
const OTHER_SOURCE = 0.01;
/** One or a few measured samples lie where a natural fat lies: 4 % either side. */
const SAMPLES = 0.04;
/** Iodine values follow origin and season more than saponification values do. [g I2/100 g] */
const IODINE_SAMPLES = 12;

/**
 * Every fat whose composition is known: its saponification and iodine value computed from the composition
 * in use, against every published value and range of that fat. The standard that gave the composition must
 * hold the computed value inside its own range with no tolerance at all.
 */
export function fatRows(
  reference: Reference,
  disagreements: ReadonlyMap<string, string>,
): readonly EvidenceRow[] {
  return [...reference.fats.values()]
    .sort((a, b) => (a.id < b.id ? -1 : 1))
    .flatMap((record) => [
      ...rowsOf(record, 'saponification-value', record.saponificationValues, (fat) =>
        saponificationValueOf(fat, reference),
      ),
      ...rowsOf(record, 'iodine-value', record.iodineValues, iodineValueOf),
    ])
    .map((row) => judged(row, disagreements));
}

type Row = Omit<EvidenceRow, 'deviation' | 'agrees' | 'disagreement'>;

function rowsOf(
  record: FatRecord,
  group: 'saponification-value' | 'iodine-value',
  values: readonly ValueRecord[],
  compute: (fat: Fat) => number | null,
): readonly Row[] {
  const fat = record.core;
  const computed = fat?.composition && fat.kind !== 'wax' ? compute(fat) : null;
  if (computed === null) return [];
  return values.map((published, index) => ({
    id: `${group}/${record.id}/${published.source}/${index + 1}`,
    group,
    subject: record.name,
    computed,
    published: { value: published.value, min: published.min, max: published.max },
    unit: published.unit,
    tolerance: toleranceFor(record, group, published),
    source: published.source,
    at: published.at,
    how: published.how,
    note: published.note,
  }));
}

function toleranceFor(
  record: FatRecord,
  group: 'saponification-value' | 'iodine-value',
  published: ValueRecord,
): number {
  const middle = published.value ?? middleOf(published);
  if (
    published.statistic !== 'range' ||
    published.samples !== null ||
    published.how === 'measured'
  ) {
    return group === 'iodine-value' ? IODINE_SAMPLES : SAMPLES * middle;
  }
  return published.source === record.chosen.composition?.source ? 0 : OTHER_SOURCE * middle;
}

const middleOf = ({ min, max }: ValueRecord) => ((min ?? max ?? 0) + (max ?? min ?? 0)) / 2;

function saponificationValueOf(fat: Fat, { constants }: Reference): number | null {
  if (!fat.composition) return null;
  const pure =
    fat.kind === 'free-acid'
      ? (1000 * constants.hydroxide.K) / meanMolarMass(fat.composition)
      : glycerideSaponificationValue(fat.composition, constants);
  return pure * (1 - fat.unsaponifiable);
}

function iodineValueOf(fat: Fat): number | null {
  if (!fat.composition) return null;
  return fat.kind === 'free-acid'
    ? freeAcidIodineValue(fat.composition)
    : glycerideIodineValue(fat.composition);
}
