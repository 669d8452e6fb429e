import type { Report } from '../report.ts';
import type { Frontmatter } from '../schema.ts';

/**
 * Changes run in one direction by revision and by date and end at this revision; a review follows.
 * `value` is the raw frontmatter: changes that are there but not sound are not missing.
 */
export function checkRecord(
  { changes = [], revision, approval }: Partial<Frontmatter>,
  value: Readonly<Record<string, unknown>>,
  report: Report,
): void {
  const newestFirst = (changes[0]?.revision ?? 0) >= (changes.at(-1)?.revision ?? 0);
  for (const [index, change] of changes.entries()) {
    const before = changes[index - 1];
    if (!before) continue;
    const [older, newer] = newestFirst ? [change, before] : [before, change];
    if (older.revision >= newer.revision) {
      report.in(['changes', index, 'revision'], 'formula/changes-order', {
        found: `revision ${change.revision} after revision ${before.revision}`,
        expected: `revisions that ${newestFirst ? 'fall' : 'rise'} from entry to entry`,
      });
    } else if (older.on > newer.on) {
      report.in(['changes', index, 'on'], 'formula/changes-order', {
        found: `revision ${newer.revision} on ${newer.on}, revision ${older.revision} on ${older.on}`,
        expected: 'the later revision on the later day',
      });
    }
  }
  const newest = Math.max(0, ...changes.map((change) => change.revision));
  if (revision !== undefined && changes.length > 0 && newest !== revision) {
    report.in(['revision'], 'formula/changes-revision', {
      found: `revision ${revision}, and changes that end at revision ${newest}`,
      expected: 'the newest change to be of this revision',
      advice: 'add a change for it or correct the number',
    });
  } else if (revision !== undefined && revision > 1 && !value.changes) {
    report.in(['revision'], 'formula/changes-revision', {
      found: `revision ${revision} without changes`,
      expected: 'a change that says what this revision did',
      advice: 'add it under changes',
    });
  }
  if (approval && approval['review-by'] <= approval.on) {
    report.in(['approval', 'review-by'], 'formula/review-before-approval', {
      found: `review-by ${approval['review-by']}, approved on ${approval.on}`,
      expected: 'a review after the approval',
    });
  }
}
