import type { Formula } from '../formulary/formula.ts';
import type { EditionRule } from '../words/en/problems-edition.ts';
import type { Problem } from '../words/problem.ts';
import { editionProblem } from './edition-problem.ts';

/** What an approval is worth on a day. */
export type ApprovalState =
  | 'approved'
  | 'changed-since-approval'
  | 'review-date-passed'
  | 'not-approved'
  | 'withdrawn';

/** Of a formula that is in use. */
export type StateInUse = Exclude<ApprovalState, 'withdrawn'>;

/** Rules that a proof edition only warns of. */
export const APPROVAL_RULES: ReadonlySet<string> = new Set<EditionRule>([
  'edition/not-approved',
  'edition/approved-later',
  'edition/changed-since-approval',
  'edition/review-date-passed',
]);

type Approvable = Pick<Formula, 'approval' | 'withdrawn'>;

/**
 * The state of a formula with this fingerprint on the day `asOf` (`2026-12-01`). The day of review itself
 * still counts. A withdrawal counts whatever its date: no weights are given on a doubt. An approval dated
 * after `asOf` is not one yet.
 */
export function approvalOf(
  { approval, withdrawn }: Approvable,
  fingerprint: string,
  asOf: string,
): ApprovalState {
  if (withdrawn) return 'withdrawn';
  if (!approval || approval.on > asOf) return 'not-approved';
  if (approval.fingerprint !== fingerprint) return 'changed-since-approval';
  return approval.reviewBy < asOf ? 'review-date-passed' : 'approved';
}

/**
 * What keeps a formula out of an edition, with the command that mends it; none where it is approved or
 * withdrawn. In a proof edition the same is a warning.
 */
export function approvalProblems(
  formula: Formula,
  fingerprint: string,
  asOf: string,
  severity: Problem['severity'],
): readonly Problem[] {
  const state = approvalOf(formula, fingerprint, asOf);
  if (state === 'approved' || state === 'withdrawn') return [];
  const { approval, code } = formula;
  const at = (path: string) => ({ file: formula.file, ...formula.places.get(path) });
  const advice = `npm run approve -- ${code} --by NAME --until DATE`;
  if (!approval) {
    const parts = { found: `no approval of ${code}`, expected: 'one', advice };
    return [editionProblem(at('code'), 'edition/not-approved', parts, severity)];
  }
  if (state === 'not-approved') {
    const parts = {
      found: `an approval of ${code} on ${approval.on}, after the as-of date ${asOf}`,
      expected: `one on ${asOf} or before`,
      advice,
    };
    return [editionProblem(at('approval.on'), 'edition/approved-later', parts, severity)];
  }
  if (state === 'review-date-passed') {
    const parts = {
      found: `an approval of ${code} that was to be reviewed by ${approval.reviewBy}`,
      expected: `a review date on or after ${asOf}`,
      advice: `review the formula, then ${advice}`,
    };
    return [
      editionProblem(at('approval.review-by'), 'edition/review-date-passed', parts, severity),
    ];
  }
  const parts = {
    found: `${code} with the fingerprint ${fingerprint}`,
    expected: `the approved one, ${approval.fingerprint}`,
    advice: `undo what changed, or ${advice}`,
  };
  return [
    editionProblem(at('approval.fingerprint'), 'edition/changed-since-approval', parts, severity),
  ];
}
