import { constantsFrom } from '../chemistry/constants.ts';
import type { AtomicWeights } from '../chemistry/molar-mass.ts';
import type { Problem } from '../words/problem.ts';
import { acidRecords } from './acids.ts';
import { alkaliRecord } from './alkali.ts';
import { blendsFrom } from './blends.ts';
import { cautionThresholdsFrom } from './caution-thresholds.ts';
import type { DataFile } from './data-files.ts';
import { fatRecord } from './fat.ts';
import { checkIds } from './ids.ts';
import { lintFat } from './lint/lint-fat.ts';
import { lotsFrom } from './lots.ts';
import type { AlkaliRecord, FatRecord } from './material-records.ts';
import { additiveRecords, liquidRecords } from './materials.ts';
import { ALKALIS, openAll, type RawData } from './raw-data.ts';
import type { Reference } from './reference.ts';
import { valueRecord } from './schema/value.ts';
import { shopFrom } from './shop.ts';
import { reportUnknownSources, sourcesFrom } from './sources.ts';
import { checkTable, modelTables, TABLES, type TableName } from './tables.ts';
import { phrasesIn, translated } from './translation.ts';

export interface ReadReference {
  /** `null` where there is any error. */
  readonly reference: Reference | null;
  readonly problems: readonly Problem[];
}

/**
 * From the texts of the data files to the checked reference. Pure; every problem at once, as far as one does
 * not hide the next. `folder` names the place of files that are missing; names and prose of the packaged data come
 * in the language of `locale`, by default the shop's.
 */
export function referenceFrom(
  files: readonly DataFile[],
  folder: string,
  locale: string | null = null,
): ReadReference {
  const problems: Problem[] = [];
  const raw = openAll(files, { folder, locale, problems });
  const { language, shop } = raw;
  const spokenIn = locale ?? shop?.value.locale;
  const phrases = language && spokenIn ? phrasesIn(language.value.phrases, spokenIn) : {};
  const spoken = language ? translated(raw, language, phrases) : raw;
  const reference = assemble(spoken, phrases);
  const broken = problems.some(({ severity }) => severity === 'error');
  return { reference: broken ? null : reference, problems };
}

/** Looks up across files. `null` where a file is missing that the rest cannot do without. */
function assemble(raw: RawData, phrases: Reference['phrases']): Reference | null {
  for (const name of Object.keys(TABLES) as TableName[]) {
    const table = raw.tables[name];
    if (table) checkTable(name, table.value, table.report);
  }
  const sources = raw.sources && sourcesFrom({ ...raw.sources.value, ...raw.ownSources?.value });
  if (sources) {
    for (const { value, report } of raw.opened) reportUnknownSources(value, sources, report);
  }
  const weights = raw.elements && atomicWeights(raw.elements);
  if (!sources || !raw.elements || !weights || !raw.acids) return null;
  const constants = constantsFrom(weights);
  const acids = acidRecords(raw.acids.value, weights, constants, raw.acids.report);

  const acidIds = new Set(Object.keys(raw.acids.value));
  const fats = new Map<string, FatRecord>();
  for (const { id, file, opened } of raw.fats) {
    if (!opened) continue;
    const fat = fatRecord(id, file, opened.value, acids);
    fats.set(id, fat);
    lintFat(fat, opened.value.exceptions ?? [], { constants, acidIds, sources }, opened.report);
  }
  // a fat whose file is broken is known: its own problems are enough
  const fatIds = new Set(raw.fats.map(({ id }) => id));
  const alkalis = new Map<string, AlkaliRecord>();
  for (const { id, opened } of raw.alkalis) {
    const alkali = opened && alkaliRecord(id, opened.value, opened.report);
    if (alkali) alkalis.set(id, alkali);
  }
  const taken = new Map<string, string>([
    ...ALKALIS.map((id) => [id, 'an alkali'] as const),
    ...[...fatIds].map((id) => [id, 'a fat'] as const),
  ]);
  for (const { file, owner } of [
    { file: raw.additives, owner: 'an additive' },
    { file: raw.liquids, owner: 'a liquid' },
  ]) {
    if (!file) continue;
    const ids = Object.keys(file.value);
    checkIds(ids, taken, file.report);
    for (const id of ids) taken.set(id, owner);
  }
  const additives =
    raw.additives && additiveRecords(raw.additives.value, weights, constants, raw.additives.report);
  const liquids =
    raw.liquids && liquidRecords(raw.liquids.value, { fats, fatIds }, weights, raw.liquids.report);
  const shop = raw.shop && shopFrom(raw.shop.value, raw.shop.report);
  const lots = raw.lots
    ? lotsFrom(raw.lots.value, { fats, fatIds }, raw.lots.report)
    : { fats: [], alkalis: [] };
  const blends = raw.blends
    ? blendsFrom(raw.blends.value, { fats, fatIds }, new Set(taken.keys()), raw.blends.report)
    : new Map<string, never>();
  const tables = everyTable(raw.tables) ? modelTables(raw.tables) : null;
  if (!additives || !liquids || !shop || !tables || !raw.cautions || !raw.soapGrades) return null;
  const cautionThresholds = cautionThresholdsFrom(
    raw.cautions.value,
    sources,
    new Set([...fatIds, ...additives.keys(), ...liquids.keys()]),
    raw.cautions.report,
  );
  const elements = new Map(
    Object.entries(raw.elements.value).map(([symbol, value]) => [symbol, valueRecord(value)]),
  );
  return {
    elements,
    constants,
    tables,
    soapGrades: raw.soapGrades.value.map((grade) => ({
      name: grade.name,
      totalFattyMatter: valueRecord(grade['total-fatty-matter']),
    })),
    acids,
    fats,
    alkalis,
    additives,
    liquids,
    sources,
    phrases,
    shop,
    lots,
    blends,
    cautionThresholds,
  };
}

/** `null` where an element that every molar mass needs has no weight. */
function atomicWeights({ value, report }: NonNullable<RawData['elements']>): AtomicWeights | null {
  const weights = new Map<string, number>();
  for (const [symbol, record] of Object.entries(value)) {
    if (record.value !== undefined) weights.set(symbol, record.value);
  }
  const missing = ['H', 'C', 'O', 'Na', 'K', 'I'].filter((symbol) => !weights.has(symbol));
  for (const symbol of missing) {
    report.in([symbol], 'data/missing-key', {
      found: `no "value" for the element ${symbol}`,
      expected: 'one for each of H, C, O, Na, K, I',
      advice: 'add it; molar masses are computed from it',
    });
  }
  return missing.length === 0 ? weights : null;
}

type EveryTable = { readonly [Name in TableName]: NonNullable<RawData['tables'][Name]> };
const everyTable = (tables: RawData['tables']): tables is EveryTable =>
  Object.values(tables).every((table) => table !== null);
