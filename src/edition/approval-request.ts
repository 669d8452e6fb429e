import { isCalendarDate } from '../formulary/calendar-date.ts';
import type { Problem } from '../words/problem.ts';
import { editionProblem } from './edition-problem.ts';

export interface ApprovalRequest {
  readonly code: string;
  /** Who approves. */
  readonly by: string;
  /** Day of the approval, and the last day on which it counts. */
  readonly on: string;
  readonly until: string;
}

/** What is wrong with a request by itself: nobody's name, days that do not exist or stand the wrong way round. */
export function requestProblems({ by, on, until }: ApprovalRequest): readonly Problem[] {
  const problems: Problem[] = [];
  if (by.trim() === '' || by.length > 120 || /[\p{Cc}\p{Cf}]/u.test(by)) {
    problems.push(
      editionProblem({ file: '--by' }, 'edition/approver-name', {
        found: by.trim() === '' ? 'no name' : `"${by.slice(0, 30)}"`,
        expected: 'the name or the post of whoever approves, on one line of at most 120 letters',
      }),
    );
  }
  for (const [option, date] of [
    ['--on', on],
    ['--until', until],
  ] as const) {
    if (isCalendarDate(date)) continue;
    problems.push(
      editionProblem({ file: option }, 'edition/approval-date', {
        found: `"${date}"`,
        expected: 'a day of the calendar as 2027-12-01',
      }),
    );
  }
  if (problems.length === 0 && until <= on) {
    problems.push(
      editionProblem({ file: '--until' }, 'edition/approval-date', {
        found: `a review on ${until} of an approval on ${on}`,
        expected: 'a review after the approval',
      }),
    );
  }
  return problems;
}
