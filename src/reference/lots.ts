import type { FatLot, Measured } from './lot-records.ts';
import type { KnownFats } from './materials.ts';
import { didYouMean } from './nearest.ts';
import { ALKALIS } from './raw-data.ts';
import type { Reference } from './reference.ts';
import type { DataReport } from './report.ts';
import type { RawLots } from './schema/lots.ts';

/** How far a measured lot may lie outside the published range before it is more likely a slip. [1] */
const TOLERANCE = 0.05;

/** The shop's lots, checked against the materials they are of. */
export function lotsFrom(
  raw: RawLots,
  { fats, fatIds }: KnownFats,
  report: DataReport,
): Reference['lots'] {
  const fatLots = raw.fats ?? [];
  const alkaliLots = raw.alkalis ?? [];
  fatLots.forEach((lot, index) => {
    const fat = fats.get(lot.fat);
    if (!fatIds.has(lot.fat)) {
      report.in(['fats', index, 'fat'], 'data/unknown-fat', {
        found: `fat "${lot.fat}"`,
        expected: 'an id from data/fats',
        advice: didYouMean(lot.fat, fatIds, 'add a file for it first'),
      });
      return;
    }
    const published = fat?.core?.saponificationValue;
    const kind = fat?.core?.kind;
    if (lot.status !== 'released' || !published || !kind) return;
    const key = kind === 'free-acid' && lot['acid-value'] !== undefined ? 'acid-value' : VALUE;
    const value = lot[key];
    if (
      value !== undefined &&
      (value < published.low * (1 - TOLERANCE) || value > published.high * (1 + TOLERANCE))
    ) {
      report.in(['fats', index, key], 'data/lot-outside-range', {
        found: `${key.replace('-', ' ')} ${value}`,
        expected: `about ${published.low} to ${published.high}, the published range`,
        advice: 'measure again before the lot is released; it may be another fat',
      });
    }
    const acid = lot['acid-value'];
    const most = lot[VALUE] ?? published.high;
    if (kind !== 'free-acid' && acid !== undefined && acid > most) {
      report.in(['fats', index, 'acid-value'], 'data/lot-acid-value', {
        found: `acid value ${acid}`,
        expected: `less than the saponification value, ${most}`,
        advice: 'the saponification value counts the free acids too; measure both again',
      });
    }
  });
  alkaliLots.forEach((lot, index) => {
    const ids: readonly string[] = ALKALIS;
    if (ids.includes(lot.alkali)) return;
    report.in(['alkalis', index, 'alkali'], 'data/unknown-alkali', {
      found: `alkali "${lot.alkali}"`,
      expected: `one of ${ids.join(', ')}`,
      advice: didYouMean(lot.alkali, ids, 'use one of these'),
    });
  });
  reportTwice(fatLots, 'fats', ({ fat }) => fat, report);
  reportTwice(alkaliLots, 'alkalis', ({ alkali }) => alkali, report);
  const placeOf = (key: 'fats' | 'alkalis', index: number) => ({
    file: report.file,
    ...report.placeOf([key, index, 'retest-by']),
  });
  return {
    fats: fatLots.map(
      (lot, index): FatLot => ({
        fat: lot.fat,
        lot: lot.lot,
        saponificationValue: measured(lot[VALUE], lot.uncertainty, lot.method),
        acidValue: measured(lot['acid-value'], lot['acid-uncertainty'], lot['acid-method']),
        status: lot.status,
        opened: lot.opened ?? null,
        retestBy: lot['retest-by'],
        place: placeOf('fats', index),
      }),
    ),
    alkalis: alkaliLots.map((lot, index) => ({
      alkali: lot.alkali,
      lot: lot.lot,
      form: lot.form,
      assay: lot.assay,
      uncertainty: lot.uncertainty,
      carbonate: lot.carbonate,
      status: lot.status,
      opened: lot.opened ?? null,
      retestBy: lot['retest-by'],
      place: placeOf('alkalis', index),
    })),
  };
}

const VALUE = 'saponification-value';

/** The schema has seen to it that the three stand together. */
const measured = (
  value: number | undefined,
  uncertainty: number | undefined,
  method: string | undefined,
): Measured | null =>
  value === undefined || uncertainty === undefined || method === undefined
    ? null
    : { value, uncertainty, method };

/** One lot number may stand there once; one material may have one released lot, or nobody knows which decides. */
function reportTwice<Lot extends { readonly lot: string; readonly status: string }>(
  lots: readonly Lot[],
  key: 'fats' | 'alkalis',
  materialOf: (lot: Lot) => string,
  report: DataReport,
): void {
  lots.forEach((lot, index) => {
    const earlier = lots.slice(0, index);
    if (earlier.some((other) => other.lot === lot.lot)) {
      report.in([key, index, 'lot'], 'data/repeated-entry', {
        found: `a second lot "${lot.lot}"`,
        expected: 'each lot once',
        advice: 'remove one of the two',
      });
    }
    const other = earlier.find(
      (one) => materialOf(one) === materialOf(lot) && one.status === 'released',
    );
    if (other && lot.status === 'released') {
      report.in([key, index, 'status'], 'data/two-released-lots', {
        found: `lots "${other.lot}" and "${lot.lot}" of ${materialOf(lot)} both released`,
        expected: 'one released lot of a material',
        advice: 'close the lot that is used up: remove it or set it to quarantine',
      });
    }
  });
}
