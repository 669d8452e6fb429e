import type { Edition } from '../edition/edition.ts';
import type { Formulary } from '../formulary/formulary.ts';
import type { EvidenceRow } from '../reference/evidence/evidence.ts';
import type { Prices } from '../reference/prices-fs.ts';
import type { Reference } from '../reference/reference.ts';
import type { SavedSearch } from '../search/saved/saved-search.ts';

/** Everything that the pages are made from. */
export interface SiteInput {
  /** Approval states, withdrawn formulas, changes, and the list that sheets are checked against. */
  readonly edition: Edition;
  /** That of the edition: formulas in use only. */
  readonly formulary: Formulary;
  /** Computed against published, for the models and the fats of the packaged data, and those data. */
  readonly evidence: { readonly rows: readonly EvidenceRow[]; readonly reference: Reference };
  readonly searches: readonly SavedSearch[];
  /** Only where the build was asked for costs: what is not here can reach no page. */
  readonly prices: Prices | null;
  /** The one date that comparisons use and that pages show, `2026-12-01`. */
  readonly asOf: string;
  /** The software that builds the pages, as CycloneDX. */
  readonly software: string;
  /** Folder of the formula files, for the pictures that they show. */
  readonly formulasFolder: string;
}

// pages are bundled apart from the command that starts the build; the process is all they share
const KEY = Symbol.for('formulary-handbook.site-input');
const shared = globalThis as typeof globalThis & { [KEY]?: SiteInput };

/** Hands the pages what they are made from; called by the commands before the build and at each reload. */
export function handOver(input: SiteInput): void {
  shared[KEY] = input;
}

/** What the pages are made from. Throws where no command has handed anything over. */
export function siteInput(): SiteInput {
  const input = shared[KEY];
  if (!input) throw new Error('No formulary was loaded. Use `npm run build` or `npm run dev`.');
  return input;
}
