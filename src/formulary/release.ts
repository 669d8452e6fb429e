import type { ReleaseLimit } from '../reference/shop-records.ts';
import type { Problem } from '../words/problem.ts';
import type { BatchDocument, FormulaDocument, ReleaseCheck } from './document.ts';
import type { Formula } from './formula.ts';

/** The limit for a formula: the last one of the shop's list that fits its kind and process. */
export function limitFor(
  formula: Pick<Formula, 'kind' | 'process'>,
  limits: readonly ReleaseLimit[],
): ReleaseLimit {
  const fitting = limits.filter(
    ({ kind, process }) =>
      (kind === 'any' || kind === formula.kind) &&
      (process === 'any' || process === formula.process),
  );
  return fitting.at(-1) ?? { kind: 'any', process: 'any', end: 'expanded', floor: 0 };
}

/** Holds the formula's interval, and each batch's with its scale, against the limit. */
export function checkRelease(
  formula: Pick<Formula, 'kind' | 'process' | 'concession'>,
  superfat: Pick<FormulaDocument['superfat'], 'expanded' | 'worstCase'>,
  batches: readonly BatchDocument[],
  limits: readonly ReleaseLimit[],
): ReleaseCheck {
  const { end, floor } = limitFor(formula, limits);
  const pick = (margin: typeof superfat) =>
    (end === 'expanded' ? margin.expanded : margin.worstCase)[0];
  let lowest = pick(superfat);
  let batch: string | null = null;
  for (const { id, superfat: weighed } of batches) {
    if (weighed && pick(weighed) < lowest) {
      lowest = pick(weighed);
      batch = id;
    }
  }
  return { end, floor, lowest, batch, met: lowest >= floor, concession: formula.concession };
}

/** The problem of a formula below its limit without a concession, or with one that it does not need. */
export function releaseProblems(
  formula: Formula,
  { release }: FormulaDocument,
): readonly Problem[] {
  const at = formula.places.get('superfat') ?? { line: 1, column: 1 };
  const where = release.batch ? ` in batch size ${release.batch}` : '';
  if (!release.met && !release.concession) {
    return [
      {
        rule: 'formula/below-release-limit',
        severity: 'error',
        file: formula.file,
        ...at,
        found: `lowest superfat ${release.lowest.toFixed(2)} % (${release.end})${where}`,
        expected: `at least ${release.floor} %, the shop's release limit`,
        advice:
          'raise the superfat, use a measured lot, or add a concession with reason, by and on',
      },
    ];
  }
  if (release.met && release.concession) {
    return [
      {
        rule: 'formula/concession-not-needed',
        severity: 'error',
        file: formula.file,
        ...(formula.places.get('concession') ?? at),
        found: `a concession, but the lowest superfat is ${release.lowest.toFixed(2)} %`,
        expected: `no concession, as the release limit of ${release.floor} % is kept`,
        advice: 'take the concession out',
      },
    ];
  }
  return [];
}
