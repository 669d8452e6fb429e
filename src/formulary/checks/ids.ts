import { suggestion } from '../../reference/nearest.ts';
import type { Known } from '../known.ts';
import type { Path, Report } from '../report.ts';

/**
 * Looks up every id, in the raw frontmatter so that a slip beside it hides nothing: fats, blends, additives,
 * liquids and batch sizes exist, and none stands twice in its list. With `known` null only the latter.
 */
export function checkIds(
  value: Readonly<Record<string, unknown>>,
  known: Known | null,
  report: Report,
): void {
  const fats = [
    ...unrepeated(value, 'fats', 'fat', report),
    ...unrepeated(value, 'after-cook-fats', 'fat', report),
  ];
  const blends = unrepeated(value, 'fats', 'blend', report);
  const additives = unrepeated(value, 'additives', 'additive', report);
  const liquids = unrepeated(value, 'liquids', 'liquid', report);
  const batches = unrepeated(value, 'batches', null, report);
  unrepeated(value, 'tags', null, report);
  if (!known) return;

  for (const fat of fats) {
    if (!isKnown(fat, FAT, known.fats, report)) continue;
    if (known.fats.get(fat.id)?.core === null) {
      report.in(fat.path, 'formula/no-data', {
        found: `fat "${fat.id}", for which the data give no saponification value with a range`,
        expected: 'a fat with one',
        advice: 'add a sourced range to its data file',
      });
    }
  }
  for (const blend of blends) isKnown(blend, BLEND, known.blends, report);
  for (const additive of additives) isKnown(additive, ADDITIVE, known.additives, report);
  for (const liquid of liquids) isKnown(liquid, LIQUID, known.liquids, report);
  for (const batch of batches) {
    if (!isKnown(batch, BATCH, known.batches, report)) continue;
    const kinds = known.batches.get(batch.id)?.kinds ?? [];
    if (typeof value.kind === 'string' && !kinds.includes(value.kind)) {
      report.in(batch.path, 'formula/batch-of-another-kind', {
        found: `batch size "${batch.id}" in a formula of kind ${value.kind}`,
        expected: `a size for ${value.kind}; "${batch.id}" is for ${kinds.join(' and ')}`,
      });
    }
  }
}

interface Named {
  readonly id: string;
  readonly path: Path;
}

const FAT = { rule: 'formula/unknown-fat', noun: 'fat', where: 'an id from data/fats' } as const;
const BLEND = {
  rule: 'formula/unknown-blend',
  noun: 'blend',
  where: "the id of one of the shop's blends, in blends.yaml",
} as const;
const ADDITIVE = {
  rule: 'formula/unknown-additive',
  noun: 'additive',
  where: "the id of one of the data's additives",
} as const;
const LIQUID = {
  rule: 'formula/unknown-liquid',
  noun: 'liquid',
  where: "the id of one of the data's liquids",
} as const;
const BATCH = {
  rule: 'formula/unknown-batch',
  noun: 'batch size',
  where: "one of the shop's batch sizes",
} as const;

function isKnown(
  { id, path }: Named,
  { rule, noun, where }: typeof FAT | typeof BLEND | typeof ADDITIVE | typeof LIQUID | typeof BATCH,
  candidates: ReadonlyMap<string, { readonly name: string }>,
  report: Report,
): boolean {
  if (candidates.has(id)) return true;
  report.in(path, rule, {
    found: `${noun} "${id}"`,
    expected: where,
    advice: suggestion(id, candidates, 'add it to the data with its sources'),
  });
  return false;
}

/**
 * The ids of a list, from entries of the key `key` or from the list itself. An additive or a liquid may
 * stand twice if it joins at another time.
 */
function unrepeated(
  value: Readonly<Record<string, unknown>>,
  list: string,
  key: string | null,
  report: Report,
): readonly Named[] {
  const entries = value[list];
  if (!Array.isArray(entries)) return [];
  const named: Named[] = [];
  const seen = new Set<string>();
  for (const [index, entry] of entries.entries()) {
    const id = key === null ? entry : (entry as Record<string, unknown> | null)?.[key];
    if (typeof id !== 'string') continue;
    const path = key === null ? [list, index] : [list, index, key];
    const at = key === null ? '' : String((entry as Record<string, unknown>).at ?? '');
    if (seen.has(`${id} ${at}`)) {
      report.in(path, 'formula/repeated-entry', {
        found: `"${id}" a second time in ${list}`,
        expected: 'each thing once',
        advice: 'add the two together or take one out',
      });
    }
    seen.add(`${id} ${at}`);
    named.push({ id, path });
  }
  return named;
}
