import { didYouMean } from './nearest.ts';
import type { DataReport } from './report.ts';

/** The basis of a rule of the trade that nobody has published, or whose publication was not read. */
export const COMMON_PRACTICE = 'common practice, no source';

/** Every limit that a caution rule asks for, and the unit that its record must state. */
export const LIMIT_UNITS = {
  'superfat-margin': '% superfat',
  'lye-boiling-margin': 'degC',
  'lye-heat': 'degC',
  'saturation-margin': 'percentage points',
  'lye-strengthened': 'percentage points',
  'vessel-fill-cold': '% of vessel',
  'vessel-fill-hot': '% of vessel',
  'alkali-retest': 'd',
  polyunsaturated: '% of fatty acids',
  oxidisability: '1',
  'rapeseed-share': '% of fats',
  'rapeseed-share-most': '% of fats',
  'castor-share': '% of fats',
  'lauric-and-myristic': '% of fatty acids',
  lauric: '% of fatty acids',
  'fast-trace-share': '% of fats',
  'unsaturated-slow': '% of fatty acids',
  'sugar-share': '% of fats',
  'salt-share': '% of fats',
  'free-acid-share': '% of fats',
  'superfat-high': '% superfat',
  'flash-point-margin': 'degC',
} as const;
export type LimitName = keyof typeof LIMIT_UNITS;

/** Every list of materials that a caution rule looks for. */
export const MATERIAL_LISTS = [
  'low-erucic-rapeseed',
  'castor',
  'fast-trace',
  'fragrance-speeds-trace',
  'alcohols',
  'flammable',
  'setting-salts',
  'chelator-once-formed',
] as const;
export type MaterialListName = (typeof MATERIAL_LISTS)[number];

export interface CautionLimit {
  readonly value: number;
  readonly unit: string;
  /** A source id or `COMMON_PRACTICE`. */
  readonly basis: string;
  readonly because: string;
}

export interface MaterialList {
  readonly ids: readonly string[];
  readonly basis: string;
  readonly because: string;
}

/** `data/cautions.yaml`: where each caution begins, and on what basis. */
export interface CautionThresholds {
  readonly limits: Readonly<Record<LimitName, CautionLimit>>;
  readonly materials: Readonly<Record<MaterialListName, MaterialList>>;
}

/** The thresholds, with every basis and every material looked up. */
export function cautionThresholdsFrom(
  raw: CautionThresholds,
  sources: ReadonlyMap<string, unknown>,
  materials: ReadonlySet<string>,
  report: DataReport,
): CautionThresholds {
  for (const section of ['limits', 'materials'] as const) {
    for (const [name, { basis }] of Object.entries(raw[section])) {
      if (basis === COMMON_PRACTICE || sources.has(basis)) continue;
      report.in([section, name, 'basis'], 'data/unknown-source', {
        found: `basis "${basis}"`,
        expected: `an id from data/sources.yaml or "${COMMON_PRACTICE}"`,
        advice: didYouMean(basis, [...sources.keys(), COMMON_PRACTICE], 'add the source first'),
      });
    }
  }
  for (const [name, { ids }] of Object.entries(raw.materials)) {
    ids.forEach((id, index) => {
      if (materials.has(id)) return;
      report.in(['materials', name, 'ids', index], 'data/unknown-word', {
        found: `material "${id}"`,
        expected: 'the id of a fat, an additive or a liquid',
        advice: didYouMean(id, materials, 'add its data first'),
      });
    });
  }
  return raw;
}
