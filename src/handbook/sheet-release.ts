import type { Formula } from '../formulary/formula.ts';
import { words } from '../words/catalogue.ts';
import { range } from '../words/numbers.ts';

export interface ReleaseCheckRow {
  readonly what: string;
  readonly limit: string;
  /** The standard by its number, and where it leaves something open, what is done here. */
  readonly method: string;
}

/** What is measured before a batch leaves the shop, against the limits that the formula states. */
export function releaseCheckRows({ release }: Formula): readonly ReleaseCheckRow[] {
  const text = words.sheetWords.release;
  const rows: ReleaseCheckRow[] = [];
  if (release.freeAlkali !== null) {
    rows.push({
      what: text.freeAlkali,
      limit: text.freeAlkaliLimit(release.freeAlkali),
      method: text.freeAlkaliMethod,
    });
  }
  if (release.ph) {
    rows.push({ what: text.ph, limit: range(...release.ph, 1), method: text.phMethod });
  }
  if (release.moisture !== null) {
    rows.push({
      what: text.moisture,
      limit: text.moistureLimit(release.moisture),
      method: text.moistureMethod,
    });
  }
  return rows;
}
