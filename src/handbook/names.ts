import { RECKONED } from '../cautions/rule.ts';
import { COMMON_PRACTICE } from '../reference/caution-thresholds.ts';
import type { Reference } from '../reference/reference.ts';
import { words } from '../words/catalogue.ts';

/** The name that people read for the id of anything that can be weighed. Throws on an id not in the data. */
export function nameOf(reference: Reference, id: string): string {
  const record =
    reference.fats.get(id) ??
    reference.blends.get(id) ??
    reference.alkalis.get(id) ??
    reference.additives.get(id) ??
    reference.liquids.get(id);
  if (!record) throw new Error(`No record of ${id} in the reference data`);
  return record.name;
}

/** Title of a source with its edition or year; an id without a record stands for itself. */
export function sourceName(reference: Reference, id: string): string {
  const source = reference.sources.get(id);
  if (id === RECKONED) return words.frame.reckoned;
  if (!source) return id === COMMON_PRACTICE ? words.frame.how['common practice'] : id;
  const edition = source.edition ?? (source.year === null ? null : String(source.year));
  return edition === null ? source.title : `${source.title}, ${edition}`;
}
