import { existsSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import type { Problem } from '../words/problem.ts';
import { filesOf, isWhole, type Verified, verifyFolder } from './checksums-fs.ts';
import { copyWhole } from './copy-fs.ts';
import type { EditionDocument } from './edition-document.ts';
import { editionProblem } from './edition-problem.ts';
import type { PublishedEntry } from './ledger.ts';
import { appendToLedger, ledgerPath, readLedger } from './ledger-fs.ts';
import { ledgerProblems } from './ledger-rules.ts';
import { type FolderLock, IN_USE, lockFolder } from './lock-fs.ts';
import { targetProblems } from './publish-target-fs.ts';
import { readEdition } from './read-edition-fs.ts';
import { healSwap, swap, swapFolders } from './swap-fs.ts';
import { writeProblem } from './write-problem.ts';

export interface PublishRequest {
  /** The folder of the edition, as built. */
  readonly from: string;
  /** The folder that readers open; its parent must be there. */
  readonly to: string;
  /** The shop's data, where the ledger is. */
  readonly data: string;
  /** Lets a proof edition through; it is not written into the ledger. */
  readonly drafts: boolean;
}

export type PublishResult =
  | {
      readonly ok: true;
      readonly edition: EditionDocument;
      readonly files: number;
      /** Where the edition that was there before now stands. */
      readonly previous: string | null;
    }
  | { readonly ok: false; readonly problems: readonly Problem[] };

/**
 * Copies an edition to where it is read: beside the old one first, flushed to the disk and held against its
 * checksums, then recorded, then swapped in. The old edition is kept. Where anything fails, it stands as it
 * was. Never throws for bad input.
 */
export function publishEdition(request: PublishRequest): PublishResult {
  const source = lockSource(request.from);
  if (!source.ok) return source;
  try {
    if (source.lock) healSwap(swapFolders(request.from));
    return publishHeld(request);
  } finally {
    source.lock?.release();
  }
}

/** The hold on the folder that is copied from; none is needed where nobody can write beside it. */
function lockSource(
  from: string,
):
  | { readonly ok: true; readonly lock: FolderLock | null }
  | Extract<PublishResult, { readonly ok: false }> {
  const taken = lockFolder(from);
  if (taken.ok) return taken;
  return taken.problems.some(({ rule }) => rule === IN_USE) ? taken : { ok: true, lock: null };
}

function publishHeld({ from, to, data, drafts }: PublishRequest): PublishResult {
  const refused = (problems: readonly Problem[]): PublishResult => ({ ok: false, problems });
  const read = readEdition(from);
  if (!read.ok) return refused(read.problems);
  const { edition } = read;
  const folders = swapFolders(to, { keepPrevious: true });
  const ledgerFile = ledgerPath(data);
  const ledger = readLedger(ledgerFile);
  const wrong = [
    ...wholenessProblems(from),
    ...(edition.proof && !drafts ? [proofProblem(from)] : []),
    ...targetProblems(from, to, edition.shop),
    ...ledger.problems,
    ...(edition.proof
      ? []
      : ledgerProblems(candidatesOf(edition, from), ledger.entries, {
          file: ledgerFile,
          severity: 'error',
        })),
  ];
  if (wrong.length > 0) return refused(wrong);
  const taken = lockFolder(to);
  if (!taken.ok) return taken;
  try {
    healSwap(folders);
    copyWhole(from, folders.next);
    const unlike = wholenessProblems(folders.next);
    const isRecorded = ledger.entries.some(
      (entry) => entry.kind === 'published' && entry.edition === edition.id,
    );
    // recorded before it is seen: what readers have is always in the ledger
    const unrecorded =
      unlike.length > 0 || edition.proof || isRecorded
        ? unlike
        : appendToLedger(ledgerFile, publishedEntry(edition));
    if (unrecorded.length > 0) {
      rmSync(folders.next, { recursive: true, force: true });
      return refused(unrecorded);
    }
    swap(folders);
  } catch (error) {
    rmSync(folders.next, { recursive: true, force: true });
    return refused([writeProblem(to, error)]);
  } finally {
    taken.lock.release();
  }
  return {
    ok: true,
    edition,
    files: filesOf(folders.current).length,
    previous: existsSync(folders.previous) ? folders.previous : null,
  };
}

/** The line of the ledger for an edition. */
export function publishedEntry(edition: EditionDocument): PublishedEntry {
  return {
    kind: 'published',
    shop: edition.shop,
    edition: edition.id,
    asOf: edition.asOf,
    formulas: edition.formulas.flatMap((entry) =>
      entry.state === 'withdrawn'
        ? []
        : {
            code: entry.code,
            revision: entry.revision,
            fingerprint: entry.fingerprint,
            digests: Object.values(entry.digests).filter((digest) => digest !== null),
          },
    ),
    withdrawn: edition.formulas.flatMap((entry) =>
      entry.state === 'withdrawn' ? { code: entry.code, on: entry.withdrawn.on } : [],
    ),
  };
}

function candidatesOf(edition: EditionDocument, from: string) {
  const placeOf = () => ({ file: join(from, 'edition.json') });
  return edition.formulas.map((entry) => ({
    code: entry.code,
    revision: entry.revision,
    fingerprint: entry.state === 'withdrawn' ? null : entry.fingerprint,
    approvedOn: entry.state === 'withdrawn' ? null : (entry.approval?.on ?? null),
    placeOf,
  }));
}

function wholenessProblems(folder: string): readonly Problem[] {
  const checked = verifyFolder(folder);
  if (!checked.ok) return checked.problems;
  return isWhole(checked.verified) ? [] : [notWhole(folder, checked.verified)];
}

function notWhole(folder: string, { missing, changed, extra }: Verified): Problem {
  const counts = { missing, changed, extra };
  const found = Object.entries(counts)
    .filter(([, names]) => names.length > 0)
    .map(
      ([what, names]) => `${names.length} ${what} (${names[0]}${names.length > 1 ? ', ...' : ''})`,
    );
  return editionProblem({ file: folder }, 'edition/not-whole', {
    found: `files that are not as they were built: ${found.join(', ')}`,
    expected: 'every file as its list of checksums has it',
    advice: 'build the edition again',
  });
}

function proofProblem(from: string): Problem {
  return editionProblem({ file: from }, 'edition/proof', {
    found: 'a proof edition, in which not every formula is approved',
    expected: 'an approved edition',
    advice: 'approve its formulas and build again, or say --drafts to publish a proof',
  });
}
