import { approvalOf } from '../edition/approval.ts';
import type { BatchDocument, FormulaDocument } from '../formulary/document.ts';
import type { Formula } from '../formulary/formula.ts';
import { words } from '../words/catalogue.ts';

/** Why a sheet or card of this batch is not one to work from on the day `asOf`; `null` where it is one. */
export function proofText(
  formula: Formula,
  { fingerprint }: Pick<FormulaDocument, 'fingerprint'>,
  { digest }: Pick<BatchDocument, 'digest'>,
  asOf: string,
): string | null {
  if (fingerprint === null || digest === null) return words.standingWords.noDigest;
  const state = approvalOf(formula, fingerprint, asOf);
  if (state === 'withdrawn')
    throw new RangeError(`${formula.code} is withdrawn: no leaf of it is made`);
  return state === 'approved' ? null : words.standingWords.states[state];
}
