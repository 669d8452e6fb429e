import type { z } from 'zod';
import type { Constants } from '../chemistry/constants.ts';
import type { Fat } from '../chemistry/materials.ts';
import type { AtomicWeights } from '../chemistry/molar-mass.ts';
import { fraction, molesPerGram } from '../chemistry/quantity.ts';
import { molarMassIn } from './acids.ts';
import { additiveLabel, materialLabel } from './label.ts';
import type { AdditiveRecord, LiquidRecord } from './material-records.ts';
import { didYouMean } from './nearest.ts';
import type { DataReport } from './report.ts';
import type { additivesSchema, liquidsSchema } from './schema/chemicals.ts';
import { leastOf, middleOf, type RawValue, valueRecord } from './schema/value.ts';

/** The additives by id, with their water and the acid that alkali neutralises. */
export function additiveRecords(
  raw: z.infer<typeof additivesSchema>,
  weights: AtomicWeights,
  constants: Constants,
  report: DataReport,
): Map<string, AdditiveRecord> {
  const additives = new Map<string, AdditiveRecord>();
  for (const [id, entry] of Object.entries(raw)) {
    const { values = {}, substance } = entry;
    let water = values.water ? (middleOf(valueRecord(values.water)) ?? 0) / 100 : 0;
    let acidity = 0;
    if (substance) {
      const path = [id, 'substance', 'formula'];
      const anhydrous = molarMassIn(substance.formula, weights, path, report);
      if (anhydrous === null) continue;
      const crystalWater = (substance['crystal-water'] ?? 0) * constants.water;
      const content = values.content ? leastOf(valueRecord(values.content)) / 100 : 1;
      water += (content * crystalWater) / (anhydrous + crystalWater);
      acidity = (content * (substance.protons ?? 0)) / (anhydrous + crystalWater);
    }
    additives.set(id, {
      id,
      name: entry.name,
      inci: entry.inci,
      kind: entry.kind,
      origin: entry.origin,
      allergens: entry.allergens ?? [],
      label: additiveLabel(entry.label),
      values: namedValues(values),
      notes: entry.notes ?? [],
      substance: substance
        ? {
            formula: substance.formula,
            crystalWater: substance['crystal-water'] ?? null,
            protons: substance.protons ?? null,
          }
        : null,
      core: { id, water: fraction(water), acidity: molesPerGram(acidity) },
    });
  }
  return additives;
}

/** The fats that could be read, and the ids of all that have a file. */
export interface KnownFats {
  readonly fats: ReadonlyMap<string, { readonly core: Fat | null }>;
  readonly fatIds: ReadonlySet<string>;
}

/** The liquids by id. Of a range of fat or acid the lower end is reckoned: less alkali is the safer error. */
export function liquidRecords(
  raw: z.infer<typeof liquidsSchema>,
  { fats, fatIds }: KnownFats,
  weights: AtomicWeights,
  report: DataReport,
): Map<string, LiquidRecord> {
  const liquids = new Map<string, LiquidRecord>();
  for (const [id, entry] of Object.entries(raw)) {
    const { values } = entry;
    const fat = leastOf(valueRecord(values.fat)) / 100;
    const fatData = entry.fat === undefined ? null : (fats.get(entry.fat)?.core ?? null);
    // a fat whose own file is broken has its problems there
    if (entry.fat !== undefined && fatIds.has(entry.fat) && !fats.has(entry.fat)) continue;
    if ((fat > 0 || entry.fat !== undefined) && fatData === null) {
      report.in([id, 'fat'], 'data/fat-of-liquid', {
        found: entry.fat === undefined ? 'fat of no named kind' : `fat "${entry.fat}"`,
        expected: 'the id of a fat with a saponification value',
        advice: didYouMean(entry.fat ?? '', fats.keys(), 'name the fat with "fat"'),
      });
      continue;
    }
    let acidity = 0;
    if (values.acid || entry.acid) {
      if (!values.acid || !entry.acid?.protons) {
        report.in([id], 'data/missing-key', {
          found: `acid of "${id}" without its amount or its formula and protons`,
          expected: 'both "acid" with formula and protons, and "acid" among the values',
          advice: 'add the other, or remove both',
        });
        continue;
      }
      const mass = molarMassIn(entry.acid.formula, weights, [id, 'acid', 'formula'], report);
      if (mass === null) continue;
      acidity = ((leastOf(valueRecord(values.acid)) / 100) * entry.acid.protons) / mass;
    }
    liquids.set(id, {
      id,
      name: entry.name,
      inci: entry.inci,
      origin: entry.origin,
      allergens: entry.allergens ?? [],
      label: materialLabel(entry.label),
      fat: entry.fat ?? null,
      values: namedValues(values),
      notes: entry.notes ?? [],
      core: {
        id,
        water: fraction((middleOf(valueRecord(values.water)) ?? 0) / 100),
        fat: fraction(fat),
        sugar: fraction((middleOf(valueRecord(values.sugar)) ?? 0) / 100),
        acidity: molesPerGram(acidity),
        fatData,
      },
    });
  }
  return liquids;
}

const namedValues = (values: Readonly<Record<string, RawValue | undefined>>) =>
  Object.entries(values).flatMap(([name, value]) =>
    value ? [{ name, ...valueRecord(value) }] : [],
  );
