import { existsSync, readFileSync, statSync } from 'node:fs';
import { join } from 'node:path';
import type { Problem } from '../words/problem.ts';
import type { EditionDocument } from './edition-document.ts';
import { editionProblem } from './edition-problem.ts';
import { editionSchema } from './edition-schema.ts';

export type EditionRead =
  | { readonly ok: true; readonly edition: EditionDocument }
  | { readonly ok: false; readonly problems: readonly Problem[] };

/** Reads an edition from its folder or from its `edition.json`. Never throws for bad input. */
export function readEdition(path: string): EditionRead {
  const file = isFolder(path) ? join(path, 'edition.json') : path;
  if (!existsSync(file)) {
    return refused(file, 'edition/not-an-edition', {
      found: 'no edition.json',
      expected: 'the folder of an edition, or its edition.json',
    });
  }
  const edition = editionSchema.safeParse(jsonOrNull(file));
  if (edition.success) return { ok: true, edition: edition.data };
  const [issue] = edition.error.issues;
  const place = issue && issue.path.length > 0 ? ` at ${issue.path.join('.')}` : '';
  return refused(file, 'edition/edition-unreadable', {
    found: `something other than an edition${place}`,
    expected: 'an edition.json as the build writes it',
    advice: 'build that edition again',
  });
}

/** Reads the edition before this one, which must be the same shop's and no proof. */
export function readLastEdition(path: string, shop: string): EditionRead {
  const read = readEdition(path);
  if (!read.ok) return read;
  if (read.edition.shop !== shop) {
    return refused(path, 'edition/edition-of-another-shop', {
      found: `an edition of "${read.edition.shop}"`,
      expected: `one of "${shop}"`,
      advice: 'give the last edition of this shop',
    });
  }
  if (read.edition.proof) {
    return refused(path, 'edition/proof', {
      found: 'a proof edition',
      expected: 'the last edition that was published',
    });
  }
  return read;
}

function refused(
  file: string,
  rule: Parameters<typeof editionProblem>[1],
  parts: Parameters<typeof editionProblem>[2],
): EditionRead {
  return { ok: false, problems: [editionProblem({ file }, rule, parts)] };
}

function isFolder(path: string): boolean {
  return statSync(path, { throwIfNoEntry: false })?.isDirectory() ?? false;
}

function jsonOrNull(file: string): unknown {
  try {
    return JSON.parse(readFileSync(file, 'utf8'));
  } catch {
    return null;
  }
}
