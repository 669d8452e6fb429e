import { z } from 'zod';
import type { Problem } from '../words/problem.ts';
import { editionProblem } from './edition-problem.ts';
import { weightsSchema } from './edition-schema.ts';
import type { WeightsPerKilogram } from './weights-per-kilogram.ts';

/**
 * The shop's record of approvals and published editions, `ledger.jsonl`: one JSON object a line, oldest
 * first. Lines are only ever added.
 */
export type LedgerEntry = ApprovedEntry | PublishedEntry;

export interface ApprovedEntry {
  readonly kind: 'approved';
  readonly shop: string;
  readonly code: string;
  readonly revision: number;
  readonly fingerprint: string;
  readonly by: string;
  readonly on: string;
  readonly reviewBy: string;
  /** With published values, which is what the approval is of. */
  readonly weights: WeightsPerKilogram;
}

export interface PublishedEntry {
  readonly kind: 'published';
  readonly shop: string;
  readonly edition: string;
  readonly asOf: string;
  readonly formulas: readonly {
    readonly code: string;
    readonly revision: number;
    readonly fingerprint: string;
    /** Weights digests of all its sheets. */
    readonly digests: readonly string[];
  }[];
  readonly withdrawn: readonly { readonly code: string; readonly on: string }[];
}

const approved: z.ZodType<ApprovedEntry> = z.object({
  kind: z.literal('approved'),
  shop: z.string(),
  code: z.string(),
  revision: z.number(),
  fingerprint: z.string(),
  by: z.string(),
  on: z.string(),
  reviewBy: z.string(),
  weights: weightsSchema,
});

const published: z.ZodType<PublishedEntry> = z.object({
  kind: z.literal('published'),
  shop: z.string(),
  edition: z.string(),
  asOf: z.string(),
  formulas: z.array(
    z.object({
      code: z.string(),
      revision: z.number(),
      fingerprint: z.string(),
      digests: z.array(z.string()),
    }),
  ),
  withdrawn: z.array(z.object({ code: z.string(), on: z.string() })),
});

const entrySchema = z.union([approved, published]);

/** Reads the text of a ledger. A line that cannot be understood is an error; empty lines are passed over. */
export function parseLedger(
  text: string,
  file: string,
): { readonly entries: readonly LedgerEntry[]; readonly problems: readonly Problem[] } {
  const entries: LedgerEntry[] = [];
  const problems: Problem[] = [];
  for (const [index, line] of text.split(/\r?\n/).entries()) {
    if (line.trim() === '') continue;
    const entry = entrySchema.safeParse(parsedOrNull(line));
    if (entry.success) entries.push(entry.data);
    else {
      problems.push(
        editionProblem({ file, line: index + 1 }, 'edition/ledger-line', {
          found: `"${line.slice(0, 40)}"`,
          expected: 'one approval or one published edition as JSON',
          advice: 'bring the line back from a copy of the ledger; it is never edited by hand',
        }),
      );
    }
  }
  return { entries, problems };
}

function parsedOrNull(line: string): unknown {
  try {
    return JSON.parse(line);
  } catch {
    return null;
  }
}

/** The line of an entry. */
export const ledgerLine = (entry: LedgerEntry): string => `${JSON.stringify(entry)}\n`;

/** The published editions, oldest first. */
export const publishedIn = (ledger: readonly LedgerEntry[]): readonly PublishedEntry[] =>
  ledger.filter((entry) => entry.kind === 'published');

/** The last recorded approval of a code. */
export const lastApproval = (
  ledger: readonly LedgerEntry[],
  code: string,
): ApprovedEntry | undefined =>
  ledger.filter((entry) => entry.kind === 'approved').findLast((entry) => entry.code === code);
