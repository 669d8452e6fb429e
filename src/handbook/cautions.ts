import type { CautionDocument } from '../formulary/document.ts';

const RANK: Readonly<Record<CautionDocument['severity'], number>> = {
  danger: 0,
  warning: 1,
  care: 2,
  note: 3,
};

/** Cautions, gravest first; within a severity in the order the rules gave them. */
export function gravestFirst(cautions: readonly CautionDocument[]): readonly CautionDocument[] {
  return cautions.toSorted((a, b) => RANK[a.severity] - RANK[b.severity]);
}
