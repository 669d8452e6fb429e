import { LANGUAGES, type Language } from '../words/languages.ts';
import { whatIsWrongWith } from './ids.ts';
import { didYouMean } from './nearest.ts';
import { TABLES, type TableName } from './tables.ts';

/** A data file by its name inside the data folder, `fats/olive.yaml`. */
export interface DataFile {
  readonly name: string;
  /** Path as the user would type it, for problems. */
  readonly file: string;
  readonly text: string;
  /** Whether it comes with the code, in English, rather than from the shop, in the language of the shop. */
  readonly packaged: boolean;
}

/** What the packaged data are written in. */
export const DATA_LANGUAGE = 'en' satisfies Language;

/** The file with the names and the prose of the packaged data in another language. */
export function languageFile(language: Language): string {
  return `languages/${language}.yaml`;
}

/** Read from every folder, a later one over an earlier one. */
const PACKAGED_FILES = [
  'sources.yaml',
  'elements.yaml',
  'acids.yaml',
  'additives.yaml',
  'liquids.yaml',
  'cautions.yaml',
  'soap-grades.yaml',
  'alkalis/sodium-hydroxide.yaml',
  'alkalis/potassium-hydroxide.yaml',
  ...(Object.keys(TABLES) as TableName[]).map((name) => `tables/${name}.yaml`),
  ...LANGUAGES.filter((language) => language !== DATA_LANGUAGE).map(languageFile),
];

/**
 * Read from the last folder only: one shop must never weigh by the lots or the scales of another, as it
 * would if these fell through from the packaged data.
 */
export const SHOP_FILES = [
  'shop.yaml',
  'lots.yaml',
  'blends.yaml',
  'prices.yaml',
  'own-sources.yaml',
];

/** Read elsewhere: by the evidence of the models, and by the pages of kept searches. */
const OTHER_FILES = ['evidence.yaml', 'searches.yaml'];

export const DATA_FOLDERS = ['fats', 'alkalis', 'tables', 'languages'] as const;

/** Whether a name is one of a data folder, and if not, what may have been meant. */
export function dataFileAdvice(name: string): string | null {
  const known = [...PACKAGED_FILES, ...SHOP_FILES, ...OTHER_FILES];
  if (known.includes(name)) return null;
  if (name.startsWith('fats/')) {
    const expected = name.endsWith('.yaml')
      ? whatIsWrongWith(name.slice(5, -5))
      : '".yaml" at its end';
    return expected === null ? null : `name it after the fat, with ${expected}`;
  }
  return didYouMean(name, known, 'move it out of the data folder');
}
