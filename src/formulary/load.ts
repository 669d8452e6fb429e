import { isAbsolute, relative, resolve } from 'node:path';
import { fileURLToPath } from 'node:url';
import { readReference } from '../reference/read-reference-fs.ts';
import type { Reference } from '../reference/reference.ts';
import type { ReadReference } from '../reference/reference-from.ts';
import type { Problem } from '../words/problem.ts';
import { computeFormula } from './compute.ts';
import type { ComputedFormula, Loaded, ShopFolders } from './formulary.ts';
import { type FormulasRead, readFormulas } from './formulas-fs.ts';
import { knownFrom } from './known.ts';
import { lotProblems } from './lot-problems.ts';
import { releaseProblems } from './release.ts';
import { measureStage } from './stages.ts';

export interface LoadOptions {
  /** The reference data that the shop's own lies over; without it the one that comes with the code. */
  readonly packagedData?: string;
  /** The day, `2026-12-01`, on which lots must not be past their retest; `null` asks nothing of dates. */
  readonly asOf?: string | null;
}

/** The reference data that comes with the code. */
export const PACKAGED_DATA = fileURLToPath(new URL('../../data', import.meta.url));

/** The data folder that comes with the code, as a user would type it from here. */
export const packagedData = (): string => asTyped(PACKAGED_DATA);

/**
 * Reads the data and all formulas of a shop and computes every formula: the one way from files to numbers.
 * All problems come at once; with any error there is no formulary. Never throws for bad input.
 */
export function loadFormulary(folders: ShopFolders, options: LoadOptions = {}): Loaded {
  const { reference, formulas, problems } = loadParts(folders, options);
  if (!reference || problems.some(({ severity }) => severity === 'error')) {
    return { ok: false, problems };
  }
  return { ok: true, formulary: { reference, formulas }, problems };
}

/**
 * What is sound in a shop's folders beside the problems of the rest, for work on one formula while another
 * is broken. Nothing is published from it.
 */
export function loadParts(
  folders: ShopFolders,
  { packagedData = PACKAGED_DATA, asOf = null }: LoadOptions = {},
): {
  readonly reference: Reference | null;
  /** Sorted by code, by code point. */
  readonly formulas: readonly ComputedFormula[];
  readonly problems: readonly Problem[];
  readonly codes: FormulasRead['codes'];
} {
  const start = performance.now();
  const { reference, problems: dataProblems } = readData(folders.data, packagedData);
  const read = readFormulas(asTyped(folders.formulas), reference ? knownFrom(reference) : null);
  const problems: Problem[] = [...dataProblems, ...read.problems];
  measureStage('read', start);
  const startOfComputing = performance.now();
  const formulas: ComputedFormula[] = [];
  if (reference) {
    if (asOf !== null) problems.push(...lotProblems(reference, read.formulas, asOf));
    for (const formula of read.formulas) {
      const result = computeFormula(formula, reference);
      problems.push(...result.problems);
      if (!result.computed) continue;
      problems.push(...releaseProblems(formula, result.computed.document));
      formulas.push(result.computed);
    }
  }
  measureStage('compute', startOfComputing);
  formulas.sort((a, b) => (a.formula.code < b.formula.code ? -1 : 1));
  return { reference, formulas, problems, codes: read.codes };
}

/** The data of a shop, over the data that come with the code; these in the language of `locale`, else the shop's. */
export const readData = (
  data: string,
  packaged: string = PACKAGED_DATA,
  locale: string | null = null,
): ReadReference => readReference(dataFolders(packaged, data).map(asTyped), locale);

/** A shop without a folder of its own and the shop whose folder is the packaged one read it once. */
function dataFolders(packaged: string, shop: string): readonly string[] {
  return resolve(packaged) === resolve(shop) ? [shop] : [packaged, shop];
}

/** Relative to the folder the command runs in, where it lies below it: problems never show a machine's path. */
function asTyped(folder: string): string {
  const fromHere = relative(process.cwd(), resolve(folder)).replaceAll('\\', '/');
  return fromHere === ''
    ? '.'
    : fromHere.startsWith('..') || isAbsolute(fromHere)
      ? folder
      : fromHere;
}
