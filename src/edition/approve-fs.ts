import { readFileSync } from 'node:fs';
import type { Formula } from '../formulary/formula.ts';
import type { ShopFolders } from '../formulary/formulary.ts';
import { imagesIn } from '../formulary/formulas-fs.ts';
import { knownFrom } from '../formulary/known.ts';
import { type LoadOptions, loadParts } from '../formulary/load.ts';
import { readFormula } from '../formulary/read-formula.ts';
import type { Problem } from '../words/problem.ts';
import { type ApprovalState, approvalOf } from './approval.ts';
import { type ApprovalRequest, requestProblems } from './approval-request.ts';
import { editionProblem } from './edition-problem.ts';
import { fingerprintOf } from './fingerprint.ts';
import { type ApprovedEntry, lastApproval, publishedIn } from './ledger.ts';
import { appendToLedger, ledgerPath, readLedger } from './ledger-fs.ts';
import { candidateOf, revisionProblems } from './ledger-rules.ts';
import { publishedCharge } from './published-charge.ts';
import { replaceFile } from './replace-file-fs.ts';
import { soundFormula } from './sound-formula.ts';
import { type WeightMove, weightMoves } from './weight-moves.ts';
import { type WeightsPerKilogram, weightsOfCharge } from './weights-per-kilogram.ts';
import { writeApproval } from './write-approval.ts';
import { writeProblem } from './write-problem.ts';

/** An approval that has been thought through and not yet written. */
export interface PendingApproval {
  readonly formula: Formula;
  readonly fingerprint: string;
  /** What the approval in the file is worth on the day of the new one. */
  readonly stateBefore: ApprovalState;
  /** The last approval on record, where there is one. */
  readonly last: ApprovedEntry | null;
  /** g for 1000 g of fats, with published values. */
  readonly weights: WeightsPerKilogram;
  /** Old and new side by side; nothing old where there is no record of an approval. */
  readonly moves: readonly WeightMove[];
  readonly shop: string;
  readonly ledger: string;
  readonly approval: NonNullable<Formula['approval']>;
  readonly bytes: Buffer;
  readonly nextText: string;
}

export type Prepared =
  | { readonly ok: true; readonly pending: PendingApproval }
  | { readonly ok: false; readonly problems: readonly Problem[] };

const NOTHING: WeightsPerKilogram = {
  fats: [],
  afterCookFats: [],
  alkali: [],
  water: 0,
  heldBack: 0,
  liquids: [],
  additives: [],
};

/**
 * Looks at everything an approval needs and writes nothing: names and dates, one sound formula with that
 * code, and what changed since it was last approved. Other formulas may be broken. Never throws for bad input.
 */
export function prepareApproval(
  folders: ShopFolders,
  request: ApprovalRequest,
  options: LoadOptions = {},
): Prepared {
  const refused = (...problems: Problem[]): Prepared => ({ ok: false, problems });
  const wrong = requestProblems(request);
  if (wrong.length > 0) return refused(...wrong);
  const parts = loadParts(folders, options);
  const { reference } = parts;
  const ledgerFile = ledgerPath(folders.data);
  const ledger = readLedger(ledgerFile);
  if (!reference || ledger.problems.length > 0) {
    return refused(
      ...parts.problems.filter(({ rule }) => rule.startsWith('data/')),
      ...ledger.problems,
    );
  }
  const found = soundFormula(parts, request.code, folders.formulas);
  if (!found.ok) return refused(...found.problems);
  const { formula } = found;
  const charge = publishedCharge(formula, reference);
  if (!charge.ok) {
    return refused(
      editionProblem({ file: formula.file }, 'edition/formula-with-errors', {
        found: `${formula.code}, for which the published values give no weights (${charge.breach.rule})`,
        expected: 'a formula that can be weighed without measured lots',
      }),
    );
  }
  const fingerprint = fingerprintOf(formula, reference);
  const used = revisionProblems(
    candidateOf(formula, fingerprint),
    publishedIn(ledger.entries),
    'error',
  );
  if (used.length > 0) return refused(...used);
  const approval = {
    by: request.by.trim(),
    on: request.on,
    reviewBy: request.until,
    fingerprint,
  };
  const written = writeInto(formula, approval, (text) => {
    const known = knownFrom(reference);
    const read = readFormula(text, formula.file, known, imagesIn(folders.formulas)).formula;
    return read && { approval: read.approval, fingerprint: fingerprintOf(read, reference) };
  });
  if (!written.ok) return refused(...written.problems);
  const last = lastApproval(ledger.entries, formula.code) ?? null;
  const weights = weightsOfCharge(charge.value);
  return {
    ok: true,
    pending: {
      formula,
      fingerprint,
      stateBefore: approvalOf(formula, fingerprint, request.on),
      last,
      weights,
      moves: weightMoves(last?.weights ?? NOTHING, weights),
      shop: reference.shop.name,
      ledger: ledgerFile,
      approval,
      ...written,
    },
  };
}

/** Writes the approval into the file and then into the ledger. Where it fails, the file is as it was. */
export function completeApproval(pending: PendingApproval): readonly Problem[] {
  const { formula, approval, bytes, nextText } = pending;
  try {
    if (replaceFile(formula.file, nextText, bytes) === 'changed')
      return [fileChanged(formula.file)];
  } catch (error) {
    return [writeProblem(formula.file, error)];
  }
  return appendToLedger(pending.ledger, {
    kind: 'approved',
    shop: pending.shop,
    code: formula.code,
    revision: formula.revision,
    fingerprint: approval.fingerprint,
    by: approval.by,
    on: approval.on,
    reviewBy: approval.reviewBy,
    weights: pending.weights,
  });
}

type Written =
  | { readonly ok: true; readonly bytes: Buffer; readonly nextText: string }
  | { readonly ok: false; readonly problems: readonly Problem[] };

/** The file with the approval in it, read back to see that it says that and nothing else. */
function writeInto(
  formula: Formula,
  approval: NonNullable<Formula['approval']>,
  readBack: (
    text: string,
  ) => { readonly approval: Formula['approval']; readonly fingerprint: string } | null,
): Written {
  const { file } = formula;
  const bytes = readFileSync(file);
  const text = bytes.toString('utf8');
  const nextText = writeApproval(text, approval);
  if (readBack(text)?.fingerprint !== approval.fingerprint) {
    return { ok: false, problems: [fileChanged(file)] };
  }
  const after = nextText === null ? null : readBack(nextText);
  const isWritten =
    after?.fingerprint === approval.fingerprint &&
    JSON.stringify(after.approval) === JSON.stringify(approval);
  if (nextText === null || !isWritten) {
    const problem = editionProblem({ file }, 'edition/approval-place', {
      found: 'frontmatter in a form that the approval cannot be written into',
      expected: 'one key a line, and an approval with by, on, review-by and fingerprint or none',
      advice: 'write the frontmatter as the starter file has it, or take the approval out',
    });
    return { ok: false, problems: [problem] };
  }
  return { ok: true, bytes, nextText };
}

function fileChanged(file: string): Problem {
  return editionProblem({ file }, 'edition/file-changed', {
    found: 'a file that changed while it was being approved',
    expected: 'the file that the weights were shown of',
    advice: 'run the command again',
  });
}
