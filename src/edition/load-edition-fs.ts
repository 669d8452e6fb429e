import { resolve } from 'node:path';
import { withCautions } from '../cautions/with-cautions.ts';
import { isCalendarDate } from '../formulary/calendar-date.ts';
import type { ShopFolders } from '../formulary/formulary.ts';
import { loadFormulary, PACKAGED_DATA } from '../formulary/load.ts';
import { measureStage } from '../formulary/stages.ts';
import { SHOP_FILES } from '../reference/data-files.ts';
import type { Problem } from '../words/problem.ts';
import { type Edition, editionOf, editionProblems } from './edition.ts';
import { editionProblem } from './edition-problem.ts';
import { type InputFile, readInputs } from './inputs-fs.ts';
import { ledgerPath, readLedger } from './ledger-fs.ts';
import { readLastEdition } from './read-edition-fs.ts';

export interface EditionOptions {
  /** `2026-12-01`; every date is compared with it, and it is recorded in the edition. */
  readonly asOf: string;
  /** A proof edition: what is not approved is a warning, and marked. */
  readonly drafts?: boolean;
  /** Folder or `edition.json` of the edition before, for the page of changes. */
  readonly last?: string | null;
  readonly packagedData?: string;
}

/** Either a whole edition or all of the problems in its way. Warnings come with both. */
export type LoadedEdition =
  | { readonly ok: true; readonly edition: Edition; readonly problems: readonly Problem[] }
  | { readonly ok: false; readonly problems: readonly Problem[] };

/**
 * From a shop's folders to the edition of a day: formulas, cautions, digests, approvals, and the ledger's
 * word on what was published before. The one way to what pages are made from. Never throws for bad input.
 */
export function loadEdition(
  folders: ShopFolders,
  { asOf, drafts = false, last = null, packagedData = PACKAGED_DATA }: EditionOptions,
): LoadedEdition {
  if (!isCalendarDate(asOf)) {
    const problem = editionProblem({ file: '--as-of' }, 'edition/as-of-date', {
      found: `"${asOf}"`,
      expected: 'a day of the calendar as 2026-12-01',
    });
    return { ok: false, problems: [problem] };
  }
  const loaded = loadFormulary(folders, { packagedData, asOf });
  const ledgerFile = ledgerPath(folders.data);
  const ledger = readLedger(ledgerFile);
  const found = [...loaded.problems, ...ledger.problems];
  if (!loaded.ok) return { ok: false, problems: found };

  const start = performance.now();
  const { formulary } = loaded;
  const before = last === null ? null : readLastEdition(last, formulary.reference.shop.name);
  const inputs = {
    asOf,
    drafts,
    files: inputFiles(folders, packagedData),
    ledger: ledger.entries,
    last: before?.ok ? before.edition : null,
  };
  const problems = [
    ...found,
    ...(before?.ok === false ? before.problems : []),
    ...editionProblems(formulary, inputs, ledgerFile),
  ];
  if (problems.some(({ severity }) => severity === 'error')) return { ok: false, problems };
  const edition = editionOf(withCautions(formulary, asOf), inputs);
  measureStage('edition', start);
  return { ok: true, edition, problems };
}

/** The packaged folder's own shop and lots are no input of another shop's edition. */
function inputFiles(folders: ShopFolders, packaged: string): readonly InputFile[] {
  const own = [
    ['formulas', folders.formulas],
    ['data', folders.data],
  ] as const;
  if (resolve(packaged) === resolve(folders.data)) return readInputs(own);
  return readInputs([...own, ['packaged', packaged]]).filter(
    ({ path }) => !SHOP_FILES.some((name) => path === `packaged/${name}`),
  );
}
