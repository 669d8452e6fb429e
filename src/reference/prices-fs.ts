import type { Problem } from '../words/problem.ts';
import { POUND } from '../words/units.ts';
import { didYouMean } from './nearest.ts';
import { openFile } from './open-file.ts';
import { readText } from './read-text-fs.ts';
import type { Reference } from './reference.ts';
import { pricesSchema } from './schema/prices.ts';

/** What the shop pays for its materials. */
export interface Prices {
  /** ISO 4217 code. */
  readonly currency: string;
  /** Per kilogram as bought, by the id of the material. */
  readonly perKilogram: ReadonlyMap<string, number>;
}

const NAME = 'prices.yaml';

/**
 * The prices of a shop, from `prices.yaml` of its data folder; `null` where there is no such file. Kept apart
 * from the reference, so that nothing that is made from the reference can give a price away.
 */
export function readPrices(
  folder: string,
  { fats, alkalis, additives, liquids }: Reference,
): { readonly prices: Prices | null; readonly problems: readonly Problem[] } {
  const file = `${folder.replace(/[/\\]+$/, '')}/${NAME}`;
  const read = readText(file);
  // a file that is there and cannot be read has been reported with the rest of the data
  if (!read.ok) return { prices: null, problems: [] };
  const problems: Problem[] = [];
  const opened = openFile(
    { name: NAME, file, text: read.text, packaged: false },
    pricesSchema,
    problems,
  );
  if (!opened) return { prices: null, problems };
  const known = [...fats, ...alkalis, ...additives, ...liquids].map(([id]) => id);
  const perKilogram = new Map<string, number>();
  for (const [i, entry] of opened.value.prices.entries()) {
    if (!known.includes(entry.material)) {
      opened.report.in(['prices', i, 'material'], 'data/unknown-word', {
        found: `material "${entry.material}"`,
        expected: 'the id of a fat, an alkali, an additive or a liquid',
        advice: didYouMean(entry.material, known, 'add its data first'),
      });
    }
    if (perKilogram.has(entry.material)) {
      opened.report.in(['prices', i, 'material'], 'data/repeated-entry', {
        found: `a second price of "${entry.material}"`,
        expected: 'one price of each material',
        advice: 'keep the one that holds',
      });
    }
    const perPound = entry['per-pound'] ?? Number.NaN;
    perKilogram.set(entry.material, entry['per-kilogram'] ?? (perPound * 1000) / POUND);
  }
  return { prices: { currency: opened.value.currency, perKilogram }, problems };
}
