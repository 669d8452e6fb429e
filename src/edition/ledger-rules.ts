import type { Formula } from '../formulary/formula.ts';
import type { Problem } from '../words/problem.ts';
import { editionProblem, type ProblemPlace } from './edition-problem.ts';
import { type LedgerEntry, type PublishedEntry, publishedIn } from './ledger.ts';

/** A formula that is about to be published. */
export interface Candidate {
  readonly code: string;
  readonly revision: number;
  /** `null` for a withdrawn one. */
  readonly fingerprint: string | null;
  readonly approvedOn: string | null;
  /** Where a key of its file stands. */
  readonly placeOf: (path: string) => ProblemPlace;
}

/** A formula of the shop's files as a candidate. */
export const candidateOf = (formula: Formula, fingerprint: string): Candidate => ({
  code: formula.code,
  revision: formula.revision,
  fingerprint: formula.withdrawn ? null : fingerprint,
  approvedOn: formula.approval?.on ?? null,
  placeOf: (path) => ({ file: formula.file, ...formula.places.get(path) }),
});

/**
 * Holds formulas against what was published: a revision says one thing for ever, revisions do not go back,
 * a published formula does not vanish, and a withdrawn one comes back only on a new approval. In a proof
 * edition the same are warnings.
 */
export function ledgerProblems(
  candidates: readonly Candidate[],
  ledger: readonly LedgerEntry[],
  { file, severity }: { readonly file: string; readonly severity: Problem['severity'] },
): readonly Problem[] {
  const published = publishedIn(ledger);
  const codes = new Set(candidates.map(({ code }) => code));
  return [
    ...candidates.flatMap((candidate) => [
      ...revisionProblems(candidate, published, severity),
      ...returnProblems(candidate, published, severity),
    ]),
    ...vanished(codes, published).map(({ code, asOf }) =>
      editionProblem(
        { file },
        'edition/formula-vanished',
        {
          found: `no ${code}, which stands in the edition of ${asOf}`,
          expected: 'every published formula, in use or withdrawn',
          advice: 'bring its file back and give it withdrawn: { on, reason, by }',
        },
        severity,
      ),
    ),
  ];
}

/** What a candidate's revision has against it; also asked before it is approved. */
export function revisionProblems(
  { code, revision, fingerprint, placeOf }: Candidate,
  published: readonly PublishedEntry[],
  severity: Problem['severity'],
): readonly Problem[] {
  if (fingerprint === null) return [];
  const at = placeOf('revision');
  const earlier = published.flatMap(({ asOf, formulas }) =>
    formulas.filter((entry) => entry.code === code).map((entry) => ({ ...entry, asOf })),
  );
  const highest = earlier.reduce((most, entry) => Math.max(most, entry.revision), 0);
  if (revision < highest) {
    const parts = {
      found: `revision ${revision} of ${code}`,
      expected: `at least ${highest}, which was published`,
      advice: `to go back, write the old formula down as revision ${highest + 1}`,
    };
    return [editionProblem(at, 'edition/revision-went-back', parts, severity)];
  }
  const other = earlier.findLast(
    (entry) => entry.revision === revision && entry.fingerprint !== fingerprint,
  );
  if (!other) return [];
  const parts = {
    found: `revision ${revision} of ${code} with the fingerprint ${fingerprint}`,
    expected: `${other.fingerprint}, as it was published in the edition of ${other.asOf}`,
    advice: `make it revision ${revision + 1}, with a change that says why`,
  };
  return [editionProblem(at, 'edition/same-revision', parts, severity)];
}

function returnProblems(
  { code, fingerprint, approvedOn, placeOf }: Candidate,
  published: readonly PublishedEntry[],
  severity: Problem['severity'],
): readonly Problem[] {
  const last = published.at(-1)?.withdrawn.find((entry) => entry.code === code);
  if (!last || fingerprint === null || approvedOn === null || approvedOn > last.on) return [];
  const parts = {
    found: `${code}, withdrawn on ${last.on}, with an approval of ${approvedOn}`,
    expected: 'an approval after the withdrawal',
    advice: `npm run approve -- ${code} --by NAME --until DATE`,
  };
  return [editionProblem(placeOf('approval.on'), 'edition/back-without-approval', parts, severity)];
}

/** Codes of the last published edition that are not among `codes`, with the date of that edition. */
function vanished(codes: ReadonlySet<string>, published: readonly PublishedEntry[]) {
  const last = published.at(-1);
  return last
    ? [...last.formulas, ...last.withdrawn]
        .filter(({ code }) => !codes.has(code))
        .map(({ code }) => ({ code, asOf: last.asOf }))
    : [];
}
