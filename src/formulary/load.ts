import { isAbsolute, relative, resolve } from 'node:path';
import { fileURLToPath } from 'node:url';
import { readReference } from '../reference/read-reference-fs.ts';
import { computeFormula } from './compute.ts';
import type { ComputedFormula, Loaded, ShopFolders } from './formulary.ts';
import { readFormulas } from './formulas-fs.ts';
import { knownFrom } from './known.ts';
import type { Problem } from './problem.ts';
import { releaseProblems } from './release.ts';

export interface LoadOptions {
  /** The reference data that the shop's own lies over; without it the one that comes with the code. */
  readonly packagedData?: string;
}

/** The reference data that comes with the code. */
export const PACKAGED_DATA = fileURLToPath(new URL('../../data', import.meta.url));

/**
 * Reads the data and all formulas of a shop and computes every formula: the one way from files to numbers.
 * All problems come at once; with any error there is no formulary. Never throws for bad input.
 */
export function loadFormulary(
  folders: ShopFolders,
  { packagedData = PACKAGED_DATA }: LoadOptions = {},
): Loaded {
  const { reference, problems: dataProblems } = readReference(
    dataFolders(packagedData, folders.data).map(asTyped),
  );
  const read = readFormulas(asTyped(folders.formulas), reference ? knownFrom(reference) : null);
  const problems: Problem[] = [...dataProblems, ...read.problems];
  const computed: ComputedFormula[] = [];
  if (reference) {
    for (const formula of read.formulas) {
      const result = computeFormula(formula, reference);
      problems.push(...result.problems);
      if (!result.computed) continue;
      problems.push(...releaseProblems(formula, result.computed.document));
      computed.push(result.computed);
    }
  }
  if (!reference || problems.some(({ severity }) => severity === 'error')) {
    return { ok: false, problems };
  }
  computed.sort((a, b) => (a.formula.code < b.formula.code ? -1 : 1));
  return { ok: true, formulary: { reference, formulas: computed }, problems };
}

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
