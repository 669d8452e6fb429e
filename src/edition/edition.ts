import type { ComputedFormula, Formulary } from '../formulary/formulary.ts';
import type { Problem } from '../words/problem.ts';
import { approvalOf, approvalProblems, type StateInUse } from './approval.ts';
import { MODELS_VERSION } from './approved-content.ts';
import type { Canonical } from './canonical-text.ts';
import { compareEditions, type EditionChanges } from './changes.ts';
import type { SheetList } from './check-sheet.ts';
import { digestOf } from './digest.ts';
import {
  currentEntry,
  type EditionDocument,
  type WithdrawnFormula,
  withdrawnEntry,
} from './edition-document.ts';
import { fingerprintOf } from './fingerprint.ts';
import type { InputFile } from './inputs-fs.ts';
import type { LedgerEntry } from './ledger.ts';
import { candidateOf, ledgerProblems } from './ledger-rules.ts';
import { lotWindowProblems } from './lot-window.ts';
import { pastSheets, sheetList } from './sheet-list.ts';
import { lotsInForce } from './weights-digest.ts';
import { withDigests } from './with-digests.ts';

/** One build of the handbook as data: all that pages may show, and nothing that they may not. */
export interface Edition {
  /** Digest of the inputs, never of the pages: the same files and day give the same id anywhere. */
  readonly id: string;
  /** The day that every date is compared with. */
  readonly asOf: string;
  /** Holds formulas that are not approved; then no page of it is for use. */
  readonly proof: boolean;
  /** Formulas in use, with cautions and digests. Withdrawn ones are not in it. */
  readonly formulary: Formulary;
  /** By code, for every formula of `formulary`. */
  readonly states: ReadonlyMap<string, StateInUse>;
  readonly withdrawn: readonly WithdrawnFormula[];
  /** What `edition.json` holds. */
  readonly document: EditionDocument;
  /** What the page that checks sheets knows. */
  readonly sheets: SheetList;
  /** Against the edition before; `null` where none was given. */
  readonly changes: EditionChanges | null;
}

/** What an edition is made from, besides the formulary. */
export interface EditionInputs {
  readonly asOf: string;
  readonly drafts: boolean;
  readonly files: readonly InputFile[];
  readonly ledger: readonly LedgerEntry[];
  readonly last: EditionDocument | null;
}

/** Everything that keeps a formulary from being published on a day; warnings in a proof edition. */
export function editionProblems(
  { formulas, reference }: Formulary,
  { asOf, drafts, ledger }: EditionInputs,
  ledgerFile: string,
): readonly Problem[] {
  const severity = drafts ? 'warning' : 'error';
  const printed = formulas.map(({ formula }) => ({
    formula,
    fingerprint: fingerprintOf(formula, reference),
  }));
  const inUse = printed.filter(({ formula }) => !formula.withdrawn);
  return [
    ...lotWindowProblems(
      inUse.map(({ formula }) => formula),
      reference,
    ),
    ...inUse.flatMap(({ formula, fingerprint }) =>
      approvalProblems(formula, fingerprint, asOf, severity),
    ),
    ...ledgerProblems(
      printed.map(({ formula, fingerprint }) => candidateOf(formula, fingerprint)),
      ledger,
      { file: ledgerFile, severity },
    ),
  ];
}

/** The edition of a formulary that has no such problem, or of any as a proof. Pure. */
export function editionOf(formulary: Formulary, inputs: EditionInputs): Edition {
  const { asOf, drafts, ledger, last } = inputs;
  const { reference } = formulary;
  const current = withDigests({
    reference,
    formulas: formulary.formulas.filter(({ formula }) => !formula.withdrawn),
  });
  const withdrawn = formulary.formulas.flatMap(({ formula }) => {
    const { file, code, name, kind, revision, changes } = formula;
    return formula.withdrawn
      ? { file, code, name, kind, revision, changes, withdrawn: formula.withdrawn }
      : [];
  });
  const entries = current.formulas.map((computed) => entryOf(computed, formulary, asOf));
  const formulas = [...entries, ...withdrawn.map(withdrawnEntry)].sort((a, b) =>
    a.code < b.code ? -1 : 1,
  );
  const past = pastSheets(formulas, ledger, asOf);
  const proof = drafts && entries.some(({ state }) => state !== 'approved');
  const id = editionId(inputs, proof, past);
  const document: EditionDocument = {
    schema: 1,
    shop: reference.shop.name,
    id,
    asOf,
    proof,
    models: MODELS_VERSION,
    formulas,
  };
  return {
    id,
    asOf,
    proof,
    formulary: current,
    states: new Map(entries.map(({ code, state }) => [code, state])),
    withdrawn,
    document,
    sheets: sheetList(document, past),
    changes: last ? compareEditions(last, document) : null,
  };
}

function entryOf({ formula, document }: ComputedFormula, { reference }: Formulary, asOf: string) {
  const fingerprint = document.fingerprint ?? fingerprintOf(formula, reference);
  const state = approvalOf(formula, fingerprint, asOf);
  if (state === 'withdrawn') throw new RangeError(`${formula.code} is withdrawn`);
  return currentEntry(
    formula,
    { ...document, fingerprint },
    state,
    lotsInForce(formula, reference),
  );
}

/** Of the ledger only what pages show counts: to publish an edition does not give its next build a new id. */
function editionId(
  { asOf, files, last }: EditionInputs,
  proof: boolean,
  past: SheetList['past'],
): string {
  return digestOf({
    models: MODELS_VERSION,
    'as-of': asOf,
    proof,
    files: files.map(({ path, hash }): Canonical => ({ path, hash })),
    past: past.map(({ digest, on }): Canonical => ({ digest, on })),
    last: last?.id ?? null,
  });
}
