import type { Report } from '../report.ts';
import type { Frontmatter } from '../schema.ts';

/** Nothing joins at a time that this kind and process do not have. */
export function checkStages(parts: Partial<Frontmatter>, report: Report): void {
  const { process, kind } = parts;
  const cold = process === 'cold';
  if (cold && (parts['after-cook-fats']?.length ?? 0) > 0) {
    report.inKey(['after-cook-fats'], 'formula/after-cook-in-cold', {
      found: 'after-cook fats in a cold process',
      expected: 'none, because nothing is cooked',
      advice: 'move them to fats, where the alkali is reckoned on them, or make the process hot',
    });
  }
  for (const list of ['liquids', 'additives'] as const) {
    for (const [index, { at }] of (parts[list] ?? []).entries()) {
      if (cold && at === 'after-cook') {
        report.in([list, index, 'at'], 'formula/after-cook-in-cold', {
          found: 'at: after-cook in a cold process',
          expected: 'lye, fats or trace, because nothing is cooked',
        });
      }
      if (kind === 'bar' && at === 'dilution') {
        report.in([list, index, 'at'], 'formula/dilution-of-a-bar', {
          found: 'at: dilution in a bar',
          expected: 'lye, fats, trace or after-cook, because a bar is not diluted',
        });
      }
    }
  }
}
