import { resolve } from 'node:path';
import { type EditionOptions, loadEdition } from '../edition/load-edition-fs.ts';
import { softwareOfBuild } from '../edition/software-fs.ts';
import type { ShopFolders } from '../formulary/formulary.ts';
import { packagedData, readData } from '../formulary/load.ts';
import { readEvidence } from '../reference/evidence/read-evidence-fs.ts';
import { readPrices } from '../reference/prices-fs.ts';
import type { Reference } from '../reference/reference.ts';
import type { ReadReference } from '../reference/reference-from.ts';
import { finderData } from '../site/find/finder-data.ts';
import { readSavedSearches } from '../site/find/saved-searches-fs.ts';
import type { SiteInput } from '../site/input.ts';
import type { Problem } from '../words/problem.ts';
import { voice } from '../words/voice.ts';

export type LoadedSite =
  | { readonly ok: true; readonly input: SiteInput; readonly problems: readonly Problem[] }
  | { readonly ok: false; readonly problems: readonly Problem[] };

export interface SiteOptions extends EditionOptions {
  /** Costs on the shopping page and in the finder. Never for an edition that hangs at the bench. */
  readonly withCosts?: boolean;
}

/** From a shop's folders to all that the pages are made from, or to every problem that stands against it. */
export function loadSite(folders: ShopFolders, options: SiteOptions): LoadedSite {
  const loaded = loadEdition(folders, options);
  if (!loaded.ok) return loaded;
  const { edition, problems } = loaded;
  const { formulary, asOf } = edition;
  const packaged = options.packagedData ?? packagedData();
  const published = packagedReference(packaged, folders, formulary.reference);
  if (!published.reference) return { ok: false, problems: [...problems, ...published.problems] };
  const evidence = readEvidence(packaged, published.reference);
  // without prices: what is kept must hold in every edition, and most show no costs
  const kept = readSavedSearches(folders.data, finderData(formulary, null));
  const priced = readPrices(folders.data, formulary.reference);
  const more = [...evidence.problems, ...kept.problems, ...priced.problems];
  if (more.length > 0) return { ok: false, problems: [...problems, ...more] };
  return {
    ok: true,
    problems,
    input: {
      edition,
      formulary,
      evidence: { rows: evidence.rows, reference: published.reference },
      searches: kept.searches,
      prices: options.withCosts ? priced.prices : null,
      asOf,
      software: softwareOfBuild(),
      formulasFolder: resolve(folders.formulas),
    },
  };
}

/**
 * The reference data as they come, without a shop's own over them: the published values of the evidence belong to
 * these, and a fat that a shop replaces must not stop its build over somebody else's row.
 */
function packagedReference(
  packaged: string,
  { data }: ShopFolders,
  used: Reference,
): ReadReference {
  return resolve(packaged) === resolve(data)
    ? { reference: used, problems: [] }
    : readData(packaged, packaged, voice().locale);
}
