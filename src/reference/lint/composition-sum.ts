import { sumOfMiddles } from '../fat.ts';
import type { LintCheck } from './check.ts';

const LEAST = 95;
const MOST = 105;

/** Middles of ranges need not sum to 100, but far from it a row is missing or a digit has slipped. */
export const compositionSum: LintCheck = {
  name: 'composition-sum',
  description: `The middles of the composition used sum to ${LEAST} to ${MOST} %.`,
  check: ({ chosen }) => {
    if (!chosen.composition) return [];
    const sum = sumOfMiddles(chosen.composition.acids);
    if (sum >= LEAST && sum <= MOST) return [];
    return [
      {
        path: ['compositions', 0],
        found: `middles that sum to ${sum.toFixed(1)} %`,
        expected: `${LEAST} to ${MOST} %`,
        advice: 'look for a missing acid or a slipped digit, or write an exception with its reason',
      },
    ];
  },
};
