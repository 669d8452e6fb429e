import { existsSync, readFileSync } from 'node:fs';
import type { Problem } from '../words/problem.ts';
import { editionProblem } from './edition-problem.ts';
import { type LedgerEntry, ledgerLine, parseLedger } from './ledger.ts';
import { replaceFile } from './replace-file-fs.ts';
import { writeProblem } from './write-problem.ts';

/** Where a shop keeps its ledger. */
export const ledgerPath = (data: string): string => `${data.replace(/[/\\]+$/, '')}/ledger.jsonl`;

/** All entries of a ledger; none where there is no file yet. Never throws for bad input. */
export function readLedger(path: string): {
  readonly entries: readonly LedgerEntry[];
  readonly problems: readonly Problem[];
} {
  if (!existsSync(path)) return { entries: [], problems: [] };
  try {
    return parseLedger(readFileSync(path, 'utf8'), path);
  } catch {
    const problem = editionProblem({ file: path }, 'edition/ledger-unreadable', {
      found: 'a ledger that cannot be opened',
      expected: 'a text file that may be read',
      advice: 'look at its permissions',
    });
    return { entries: [], problems: [problem] };
  }
}

/** Adds one entry at the end, as one step: an interruption leaves the ledger as it was. */
export function appendToLedger(path: string, entry: LedgerEntry): readonly Problem[] {
  try {
    const read = existsSync(path) ? readFileSync(path) : null;
    const text = read?.toString('utf8') ?? '';
    const before = text === '' || text.endsWith('\n') ? text : `${text}\n`;
    if (replaceFile(path, before + ledgerLine(entry), read) === 'replaced') return [];
    return [
      editionProblem({ file: path }, 'edition/file-changed', {
        found: 'a ledger that somebody else wrote to at the same moment',
        expected: 'one writer at a time',
        advice: 'run the command again',
      }),
    ];
  } catch (error) {
    return [writeProblem(path, error)];
  }
}
