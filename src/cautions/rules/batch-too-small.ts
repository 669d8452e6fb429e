import { type CautionRule, RECKONED } from '../rule.ts';

const TOO_SMALL = ['size-too-small-for-scale', 'weight-below-scale-step'];

/** A size without weights, because the scale cannot show them finely enough. */
export const rule: CautionRule<'batch-too-small'> = {
  id: 'batch-too-small',
  severity: 'warning',
  basis: RECKONED,
  applies: ({ document }) =>
    document.batches
      .filter(({ refused }) => refused && TOO_SMALL.includes(refused.rule))
      .map(({ label }) => ({ batch: label })),
};
