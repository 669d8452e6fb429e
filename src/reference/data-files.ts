import { whatIsWrongWith } from './ids.ts';
import { didYouMean } from './nearest.ts';
import { TABLES, type TableName } from './tables.ts';

/** A data file by its name inside the data folder, `fats/olive.yaml`. */
export interface DataFile {
  readonly name: string;
  /** Path as the user would type it, for problems. */
  readonly file: string;
  readonly text: string;
}

/** Read from every folder, a later one over an earlier one. */
export const PACKAGED_FILES = [
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
];

/**
 * Read from the last folder only: one shop must never weigh by the lots or the scales of another, as it
 * would if these fell through from the packaged data.
 */
export const SHOP_FILES = ['shop.yaml', 'lots.yaml', 'blends.yaml', 'prices.yaml'];

/** Read elsewhere: by the evidence of the models, and by the pages of kept searches. */
const OTHER_FILES = ['evidence.yaml', 'searches.yaml'];

export const DATA_FOLDERS = ['fats', 'alkalis', 'tables'] as const;

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
