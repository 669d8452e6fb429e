import { resolve } from 'node:path';
import { withCautions } from '../cautions/with-cautions.ts';
import { withDigests } from '../edition/with-digests.ts';
import type { ShopFolders } from '../formulary/formulary.ts';
import { loadFormulary, packagedData } from '../formulary/load.ts';
import type { Problem } from '../formulary/problem.ts';
import { readEvidence } from '../reference/evidence/read-evidence-fs.ts';
import { finderData } from '../site/find/finder-data.ts';
import { readSavedSearches } from '../site/find/saved-searches-fs.ts';
import type { SiteInput } from '../site/input.ts';

export type LoadedSite =
  | { readonly ok: true; readonly input: SiteInput; readonly problems: readonly Problem[] }
  | { readonly ok: false; readonly problems: readonly Problem[] };

/** From a shop's folders to all that the pages are made from, or to every problem that stands against it. */
export function loadSite(folders: ShopFolders, asOf: string): LoadedSite {
  const loaded = loadFormulary(folders, { asOf });
  if (!loaded.ok) return loaded;
  const { reference, formulas } = withDigests(withCautions(loaded.formulary, asOf));
  const evidence = readEvidence(packagedData(), reference);
  if (evidence.problems.length > 0) {
    return { ok: false, problems: [...loaded.problems, ...evidence.problems] };
  }
  // what is withdrawn reaches no page and no file
  const inUse = { reference, formulas: formulas.filter(({ formula }) => !formula.withdrawn) };
  const kept = readSavedSearches(folders.data, finderData(inUse));
  if (kept.problems.length > 0) {
    return { ok: false, problems: [...loaded.problems, ...kept.problems] };
  }
  return {
    ok: true,
    problems: loaded.problems,
    input: {
      formulary: inUse,
      evidence: evidence.rows,
      searches: kept.searches,
      asOf,
      formulasFolder: resolve(folders.formulas),
    },
  };
}

/** Today in UTC, `2026-12-01`, for builds that are given no date. */
export const today = (): string => new Date().toISOString().slice(0, 10);
