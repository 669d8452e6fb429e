import { type CautionRule, RECKONED } from '../rule.ts';

/** Published below the shop's release limit, with permission. */
export const rule: CautionRule<'concession-in-force'> = {
  id: 'concession-in-force',
  severity: 'warning',
  basis: RECKONED,
  applies: ({ document: { release } }) => {
    const { met, concession, floor, lowest } = release;
    return !met && concession ? [{ floor, lowest, by: concession.by, on: concession.on }] : [];
  },
};
