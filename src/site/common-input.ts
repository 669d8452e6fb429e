import type { Reference } from '../reference/reference.ts';

/**
 * What every page may read, of any formula: nothing of another formula is in it but what stands here by name. A page
 * that is kept for the next build is kept under the hash of all of this and of its own formula, so it may read
 * nothing else.
 */
export interface CommonInput {
  /** With the shop, its lots and its blends. */
  readonly reference: Reference;
  /** The one date that comparisons use and that pages show, `2026-12-01`. */
  readonly asOf: string;
  /** Whether no page of the edition is for use. */
  readonly proof: boolean;
  /** The edition as pages show it: its id, or the mark that gives way to the id once all pages are written. */
  readonly edition: string;
  /** Names of the materials in use, in any formula, that come from tree nuts or peanut. */
  readonly nutSources: readonly string[];
}

/**
 * Stands in written pages for the id of the edition, which changes with every input. Of a private-use character, which
 * nobody types.
 */
export const EDITION_MARK = '\u{F8FF}edition\u{F8FF}';

// pages are bundled apart from the command that starts the build; the process is all they share
const KEY = Symbol.for('formulary-handbook.common-input');
const shared = globalThis as typeof globalThis & { [KEY]?: CommonInput };

export function handOverCommon(input: CommonInput): void {
  shared[KEY] = input;
}

/** What every page may read. Throws where no command has handed anything over. */
export function commonInput(): CommonInput {
  const input = shared[KEY];
  if (!input) throw new Error('No formulary was loaded. Use `npm run build` or `npm run dev`.');
  return input;
}
