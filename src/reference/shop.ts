import { grams } from '../chemistry/quantity.ts';
import type { UnitSystem } from '../words/units.ts';
import { didYouMean } from './nearest.ts';
import type { DataReport } from './report.ts';
import type { Written } from './schema/measure.ts';
import type { RawShop } from './schema/shop.ts';
import type { BatchSize, Shop } from './shop-records.ts';

/** Lye tables are named after their size; this name is taken by the table over the fats. */
const ALL_FATS = 'fats';

/** The shop's settings. Percentages of losses become fractions, masses grams. */
export function shopFrom(raw: RawShop, report: DataReport): Shop {
  reportRepeated(raw.batches, 'batches', report);
  reportRepeated(raw.scales, 'scales', report);
  const units = raw.weights ?? 'metric';
  reportOtherUnits(raw.scales, units, report);
  const scales = raw.scales.map(({ id, name, step, error, capacity }) => ({
    id,
    name,
    step: wholeGrams(step),
    error: wholeGrams(error),
    capacity: wholeGrams(capacity),
  }));
  const known = scales.map(({ id }) => id);
  const batches = raw.batches.map((batch, index): BatchSize => {
    if (batch.id === ALL_FATS) {
      report.in(['batches', index, 'id'], 'data/text-form', {
        found: `the id "${ALL_FATS}"`,
        expected: 'another one',
        advice: 'the table of alkali for each fat has that address',
      });
    }
    for (const key of ['scale', 'fine-scale'] as const) {
      const scale = batch[key];
      if (scale === undefined || known.includes(scale)) continue;
      report.in(['batches', index, key], 'data/unknown-scale', {
        found: `scale "${scale}"`,
        expected: `one of ${known.join(', ')}`,
        advice: didYouMean(scale, known, 'add it under "scales"'),
      });
    }
    return {
      id: batch.id,
      label: batch.label,
      size: sizeOf(batch),
      losses: (batch.losses ?? 0) / 100,
      scale: batch.scale,
      fineScale: batch['fine-scale'] ?? null,
      kinds: batch.kinds,
      ...(batch.vessel === undefined ? {} : { vessel: batch.vessel }),
      ...(batch['heat-limit'] === undefined ? {} : { heatLimit: grams(batch['heat-limit']) }),
    };
  });
  return {
    name: raw.name,
    invented: raw.invented ?? false,
    units,
    siteAddress: raw['site-address']?.replace(/\/*$/, '/') ?? null,
    batches,
    scales,
    startTemperature: raw['start-temperature'],
    releaseMoisture: raw['release-moisture'],
    largestSuperfatShift: raw['largest-superfat-shift'],
    ...(raw['rework-cap'] === undefined ? {} : { reworkCap: raw['rework-cap'] }),
    ...(raw['any-size'] && { anySize: true }),
    emergency: raw.emergency,
    rules: raw.rules ?? [],
    releaseLimits: raw['release-limits'],
  };
}

/** A tenth of an ounce times its factor is 2.8349523125 and not the next number that binary has above it. */
const wholeGrams = ({ value }: Written) => grams(Number(value.toPrecision(14)));

const UNITS_OF = { metric: 'g or kg', us: 'oz or lb' } as const;

/** What a scale shows is what a sheet prints, and a sheet has one unit. */
function reportOtherUnits(scales: RawShop['scales'], units: UnitSystem, report: DataReport): void {
  scales.forEach((scale, index) => {
    for (const key of ['step', 'error', 'capacity'] as const) {
      const { system } = scale[key];
      if (system === units) continue;
      report.in(['scales', index, key], 'data/scale-units', {
        found: `the ${key} of scale "${scale.id}" in ${UNITS_OF[system]}, in a shop that weighs in ${UNITS_OF[units]}`,
        expected: UNITS_OF[units],
        advice: `state what the scale shows in the shop's units, or set "weights: ${system}"`,
      });
    }
  });
}

/** The schema has seen to it that exactly one way is stated. */
function sizeOf(batch: RawShop['batches'][number]): BatchSize['size'] {
  if (batch.fats !== undefined) return { by: 'fats', mass: grams(batch.fats) };
  if (batch.batter !== undefined) return { by: 'batter', mass: grams(batch.batter) };
  if (batch.mould !== undefined) return { by: 'mould', millilitres: batch.mould };
  return { by: 'bars', count: batch.bars ?? 0, wetMass: grams(batch['wet-mass'] ?? 0) };
}

function reportRepeated(
  entries: readonly { readonly id: string }[],
  key: string,
  report: DataReport,
): void {
  entries.forEach(({ id }, index) => {
    if (entries.findIndex((entry) => entry.id === id) === index) return;
    report.in([key, index, 'id'], 'data/repeated-entry', {
      found: `a second "${id}"`,
      expected: 'each id once',
      advice: 'rename or remove one of the two',
    });
  });
}
