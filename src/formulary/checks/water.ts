import type { Report } from '../report.ts';
import type { Frontmatter } from '../schema.ts';

const FORMS = ['lye-concentration', 'per-alkali', 'percent-of-fats'] as const;

/** The water is stated once, and liquids do not replace more than all of it. */
export function checkWater({ water, liquids }: Partial<Frontmatter>, report: Report): void {
  if (water) {
    const stated = FORMS.filter((form) => water[form] !== undefined);
    if (stated.length === 0) {
      report.in(['water'], 'formula/no-water', {
        found: 'no amount of water',
        expected: `one of ${FORMS.join(', ')}`,
      });
    }
    for (const form of stated.slice(1)) {
      report.inKey(['water', form], 'formula/water-twice', {
        found: `${form} beside ${stated[0]}`,
        expected: 'the water stated in one way',
        advice: 'take one of the two out',
      });
    }
  }
  const replaced = (liquids ?? []).reduce((sum, liquid) => sum + liquid['replaces-water'], 0);
  if (replaced > 100) {
    report.in(['liquids'], 'formula/replaced-water', {
      found: `liquids that replace ${replaced} % of the water`,
      expected: 'at most 100 % together',
    });
  }
}
