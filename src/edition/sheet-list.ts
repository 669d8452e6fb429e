import type { SheetList } from './check-sheet.ts';
import type { EditionDocument, EditionEntry } from './edition-document.ts';
import { type LedgerEntry, publishedIn } from './ledger.ts';

type Past = SheetList['past'][number];

/** All digests that a sheet could bear: those of the edition, and those of earlier ones. */
export function sheetList(edition: EditionDocument, past: readonly Past[]): SheetList {
  return {
    shop: edition.shop,
    edition: edition.id,
    asOf: edition.asOf,
    proof: edition.proof,
    current: currentSheets(edition.formulas),
    withdrawn: edition.formulas.flatMap((entry) =>
      entry.state === 'withdrawn' ? { code: entry.code, on: entry.withdrawn.on } : [],
    ),
    past,
  };
}

/** Of approved formulas only: what a proof edition holds besides is current nowhere. */
function currentSheets(formulas: readonly EditionEntry[]): SheetList['current'] {
  return formulas.flatMap((entry) =>
    entry.state === 'approved'
      ? {
          code: entry.code,
          revision: entry.revision,
          digests: Object.values(entry.digests).filter((digest) => digest !== null),
        }
      : [],
  );
}

/**
 * Every digest that was published and is not in the edition, with the day on which it went out of the
 * editions; sorted by digest.
 */
export function pastSheets(
  formulas: readonly EditionEntry[],
  ledger: readonly LedgerEntry[],
  asOf: string,
): readonly Past[] {
  const inForce = new Set(currentSheets(formulas).flatMap(({ digests }) => digests));
  const editions = publishedIn(ledger);
  const sheets = new Map<string, Past>();
  for (const [index, { formulas }] of editions.entries()) {
    const on = editions[index + 1]?.asOf ?? asOf;
    for (const { code, revision, digests } of formulas) {
      for (const digest of digests) sheets.set(digest, { code, revision, digest, on });
    }
  }
  return [...sheets.values()]
    .filter(({ digest }) => !inForce.has(digest))
    .sort((a, b) => (a.digest < b.digest ? -1 : 1));
}
