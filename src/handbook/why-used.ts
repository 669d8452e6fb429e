import { placeInOrder } from '../reference/choice.ts';
import type { CompositionRecord, Source, ValueRecord } from '../reference/values.ts';
import { words } from '../words/catalogue.ts';

type Sources = ReadonlyMap<string, Source>;

/** Why a value is used or is not: the first reason that the order of choice gives. */
export function whyValueUsed(
  record: ValueRecord,
  used: ValueRecord | null,
  sources: Sources,
): string {
  const { used: isUsed, noneUsed, why } = words.contradictionsPage;
  if (record === used) return isUsed;
  if (used === null) return noneUsed;
  if (placeInOrder(record, sources) > placeInOrder(used, sources)) {
    return whyLater(record, used, sources);
  }
  if (record.samples !== null) return why.samples(record.samples);
  if (record.value !== null) return why.single;
  if (record.min === null || record.max === null) return why.open;
  return why.file;
}

/** Why a composition is used or is not. */
export function whyCompositionUsed(
  record: CompositionRecord,
  used: CompositionRecord | null,
  sources: Sources,
): string {
  const { used: isUsed, noneUsed, why } = words.contradictionsPage;
  if (record === used) return isUsed;
  if (used === null) return noneUsed;
  return placeInOrder(record, sources) > placeInOrder(used, sources)
    ? whyLater(record, used, sources)
    : why.file;
}

function whyLater(
  record: ValueRecord | CompositionRecord,
  used: ValueRecord | CompositionRecord,
  sources: Sources,
): string {
  const { kinds, why } = words.contradictionsPage;
  const kindOf = (each: ValueRecord | CompositionRecord) => sources.get(each.source)?.kind;
  const [usedKind, otherKind] = [kindOf(used), kindOf(record)];
  return usedKind && otherKind && usedKind !== otherKind
    ? why.kind(kinds[usedKind], kinds[otherKind])
    : why.memory;
}
