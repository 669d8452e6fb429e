import type { Formula } from '../formulary/formula.ts';
import type { ComputedFormula } from '../formulary/formulary.ts';
import type { loadParts } from '../formulary/load.ts';
import { sameCode } from '../formulary/same-code.ts';
import { didYouMean } from '../reference/nearest.ts';
import type { Problem } from '../words/problem.ts';
import { editionProblem } from './edition-problem.ts';

export type Found =
  | { readonly ok: true; readonly formula: Formula }
  | { readonly ok: false; readonly problems: readonly Problem[] };

/** The one formula with a code, if it is in use and has no error; other formulas may have some. */
export function soundFormula(
  { formulas, problems, codes }: ReturnType<typeof loadParts>,
  code: string,
  folder: string,
): Found {
  const owners = codes.filter((entry) => sameCode(entry.text) === sameCode(code));
  const [owner, second] = owners;
  if (!owner) {
    const problem = editionProblem({ file: folder }, 'edition/unknown-code', {
      found: `no formula "${code}"`,
      expected: 'the code of a formula in this folder',
      advice: didYouMean(
        code,
        codes.map(({ text }) => text),
        'see npm run check for files that cannot be read',
      ),
    });
    return { ok: false, problems: [problem] };
  }
  if (second) {
    const problem = editionProblem({ file: second.file }, 'edition/code-twice', {
      found: `${second.text}, which ${owner.file} has too`,
      expected: 'one file for each code',
      advice: 'give one of the two another code',
    });
    return { ok: false, problems: [problem] };
  }
  const own = problems.filter(({ file, severity }) => file === owner.file && severity === 'error');
  const computed: ComputedFormula | undefined = formulas.find(
    ({ formula }) => formula.file === owner.file,
  );
  if (own.length > 0 || !computed) {
    const problem = editionProblem({ file: owner.file }, 'edition/formula-with-errors', {
      found: `${owner.text} with ${own.length === 1 ? 'an error' : `${own.length} errors`}`,
      expected: 'a formula without',
    });
    return { ok: false, problems: [...own, problem] };
  }
  const { formula } = computed;
  if (formula.withdrawn) {
    const at = { file: formula.file, ...formula.places.get('withdrawn') };
    const problem = editionProblem(at, 'edition/formula-withdrawn', {
      found: `${formula.code}, withdrawn on ${formula.withdrawn.on}`,
      expected: 'a formula in use',
      advice: 'take withdrawn out of its file first, if it is to come back',
    });
    return { ok: false, problems: [problem] };
  }
  return { ok: true, formula };
}
