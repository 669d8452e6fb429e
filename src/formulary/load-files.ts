import type { Reference } from '../reference/reference.ts';
import type { Problem } from '../words/problem.ts';
import { computeFormula } from './compute.ts';
import type { ComputedFormula } from './formulary.ts';
import { readFormulaFile } from './formulas-fs.ts';
import { knownFrom } from './known.ts';
import { readData } from './load.ts';

/**
 * Single formula files, inside or outside the formulary, computed with a shop's data. A breached release
 * limit is no problem here: it stands in the document. Files that are not sound are left out and their
 * problems given; the order is that of `files`. Never throws for bad input.
 */
export function loadFiles(
  files: readonly string[],
  data: string,
): {
  readonly reference: Reference | null;
  readonly formulas: readonly ComputedFormula[];
  readonly problems: readonly Problem[];
} {
  const { reference, problems: dataProblems } = readData(data);
  const problems: Problem[] = [...dataProblems];
  const known = reference && knownFrom(reference);
  const formulas = files.flatMap((file): ComputedFormula[] => {
    const { formula, problems: found } = readFormulaFile(file, known);
    problems.push(...found);
    if (!formula || !reference) return [];
    const { computed, problems: refused } = computeFormula(formula, reference);
    problems.push(...refused);
    return computed ? [computed] : [];
  });
  return { reference, formulas, problems };
}
