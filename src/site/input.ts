import type { Edition } from '../edition/edition.ts';
import type { Formulary } from '../formulary/formulary.ts';
import { nutSources } from '../handbook/materials/allergens.ts';
import type { EvidenceRow } from '../reference/evidence/evidence.ts';
import type { Prices } from '../reference/prices-fs.ts';
import type { Reference } from '../reference/reference.ts';
import type { SavedSearch } from '../search/saved/saved-search.ts';
import { type CommonInput, handOverCommon } from './common-input.ts';

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
const shared = globalThis as typeof globalThis & {
  [KEY]?: { readonly input: SiteInput; closed: boolean };
};

/**
 * Hands the pages what they are made from; called by the commands before the build and at each reload. `shown` is the
 * edition as pages show it: its id, or the mark that gives way to it later.
 */
export function handOver(input: SiteInput, shown: string): void {
  shared[KEY] = { input, closed: false };
  handOverCommon(commonOf(input, shown));
}

/** What every page may read of this. */
export const commonOf = (
  { edition, formulary, asOf }: Pick<SiteInput, 'edition' | 'formulary' | 'asOf'>,
  shown: string,
): CommonInput => ({
  reference: formulary.reference,
  asOf,
  proof: edition.proof,
  edition: shown,
  nutSources: nutSources(formulary),
});

/**
 * What the pages are made from. Throws where no command has handed anything over, and for a page that is kept for the
 * next build: it may read `commonInput()` and what it is given, because only these are in what it is kept under.
 */
export function siteInput(): SiteInput {
  const given = shared[KEY];
  if (!given) throw new Error('No formulary was loaded. Use `npm run build` or `npm run dev`.');
  if (given.closed) throw new Error('A page that is kept may not read the whole formulary.');
  return given.input;
}

/** Does some work during which nothing can read the whole formulary. */
export async function withoutFormulary<Result>(work: () => Promise<Result>): Promise<Result> {
  const given = shared[KEY];
  if (given) given.closed = true;
  try {
    return await work();
  } finally {
    if (given) given.closed = false;
  }
}
