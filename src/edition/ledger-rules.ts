import type { Formula } from '../formulary/formula.ts';
import type { Problem } from '../reference/problem.ts';
import { editionProblem } from './edition-problem.ts';
import { type LedgerEntry, type PublishedEntry, publishedIn } from './ledger.ts';

/**
 * Holds formulas against what was published: a revision says one thing for ever, revisions do not go back,
 * a published formula does not vanish, and a withdrawn one comes back only on a new approval. In a proof
 * edition the same are warnings.
 */
export function ledgerProblems(
  formulas: readonly { readonly formula: Formula; readonly fingerprint: string }[],
  ledger: readonly LedgerEntry[],
  { file, severity }: { readonly file: string; readonly severity: Problem['severity'] },
): readonly Problem[] {
  const published = publishedIn(ledger);
  const codes = new Set(formulas.map(({ formula }) => formula.code));
  return [
    ...formulas.flatMap(({ formula, fingerprint }) =>
      formula.withdrawn
        ? []
        : [
            ...revisionProblems(formula, fingerprint, published, severity),
            ...returnProblems(formula, published, severity),
          ],
    ),
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

function revisionProblems(
  formula: Formula,
  fingerprint: string,
  published: readonly PublishedEntry[],
  severity: Problem['severity'],
): readonly Problem[] {
  const { code, revision, file, places } = formula;
  const at = { file, ...places.get('revision') };
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
  { code, approval, file, places }: Formula,
  published: readonly PublishedEntry[],
  severity: Problem['severity'],
): readonly Problem[] {
  const last = published.at(-1)?.withdrawn.find((entry) => entry.code === code);
  if (!last || !approval || approval.on > last.on) return [];
  const parts = {
    found: `${code}, withdrawn on ${last.on}, with an approval of ${approval.on}`,
    expected: 'an approval after the withdrawal',
    advice: `npm run approve -- ${code} --by NAME --until DATE`,
  };
  const at = { file, ...places.get('approval.on') };
  return [editionProblem(at, 'edition/back-without-approval', parts, severity)];
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
