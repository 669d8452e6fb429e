import { didYouMean } from '../../reference/nearest.ts';
import type { Place } from '../../reference/yaml.ts';
import type { Problem } from '../../words/problem.ts';
import type { FormulaRead } from '../read-formula.ts';
import { formulaProblem } from '../report.ts';
import { sameCode } from '../same-code.ts';

/** What can only be seen with all files at hand: one code is one formula, and links find theirs. */
export function checkAcross(
  reads: readonly { readonly file: string; readonly read: FormulaRead }[],
): readonly Problem[] {
  const problems: Problem[] = [];
  const owners = new Map<
    string,
    { readonly file: string; readonly code: string; readonly place: Place }
  >();
  for (const { file, read } of reads) {
    if (!read.code) continue;
    const { text: code, place } = read.code;
    const owner = owners.get(sameCode(code));
    if (owner) {
      problems.push(
        formulaProblem(file, place, 'formula/duplicate-code', {
          found: `code "${code}", which is "${owner.code}" at ${owner.file}:${owner.place.line}:${owner.place.column}`,
          expected: 'a code of its own',
          advice: 'give one of the two another; capitals and leading zeros make no difference',
        }),
      );
    } else owners.set(sameCode(code), { file, code, place });
  }
  const codes = [...owners.values()].map(({ code }) => code);
  for (const { file, read } of reads) {
    for (const { code, place } of read.links) {
      if (codes.includes(code)) continue;
      problems.push(
        formulaProblem(file, place, 'formula/unknown-formula', {
          found: `a link to formula "${code}"`,
          expected: 'the code of a formula in this folder',
          advice: didYouMean(code, codes, ''),
        }),
      );
    }
  }
  return problems;
}
