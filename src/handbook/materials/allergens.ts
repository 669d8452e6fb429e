import type { ComputedFormula, Formulary } from '../../formulary/formulary.ts';
import type { Reference } from '../../reference/reference.ts';
import { nameOf } from '../names.ts';
import { materialIds } from './uses.ts';

/** A known source of allergens that meets the shop's equipment. */
export interface MetAllergen {
  readonly source: string;
  /** Ids of the materials that bring it. */
  readonly materials: readonly string[];
  readonly codes: readonly string[];
}

/** Formulas that share their sources of allergens, to be made one after the other. */
export interface MakingStep {
  readonly sources: readonly string[];
  readonly formulas: readonly { readonly code: string; readonly name: string }[];
  /** Sources of earlier steps that these formulas must not meet: clean down first. Empty: just go on. */
  readonly cleanOf: readonly string[];
}

/** Sources of allergens by the data's marks, of a material and of the fat inside a liquid. */
export function allergensOfMaterial(id: string, reference: Reference): readonly string[] {
  const { fats, additives, liquids } = reference;
  const inside = liquids.get(id)?.fat ?? null;
  return [
    ...new Set([
      ...((fats.get(id) ?? additives.get(id) ?? liquids.get(id))?.allergens ?? []),
      ...(inside === null ? [] : (fats.get(inside)?.allergens ?? [])),
    ]),
  ];
}

/** What the equipment meets if all formulas are made on it, by source. */
export function allergensMet({ formulas, reference }: Formulary): readonly MetAllergen[] {
  const met = new Map<string, { materials: Set<string>; codes: string[] }>();
  for (const computed of formulas) {
    const ids = [...materialIds(computed)];
    for (const source of sourcesOf(computed, reference)) {
      const entry = met.get(source) ?? { materials: new Set(), codes: [] };
      met.set(source, entry);
      entry.codes.push(computed.document.code);
      for (const id of ids) {
        if (allergensOfMaterial(id, reference).includes(source)) entry.materials.add(id);
      }
    }
  }
  return [...met]
    .map(([source, { materials, codes }]) => ({ source, codes, materials: [...materials].sort() }))
    .sort((a, b) => (a.source < b.source ? -1 : 1));
}

/**
 * An order of making that keeps allergens last: formulas without any first, then those with one source, then
 * those with more. Where a step must not meet what an earlier one left behind, it says what to clean off.
 */
export function makingOrder({ formulas, reference }: Formulary): readonly MakingStep[] {
  const groups = new Map<
    string,
    { sources: readonly string[]; formulas: MakingStep['formulas'] }
  >();
  for (const computed of formulas) {
    const sources = sourcesOf(computed, reference);
    const key = sources.join(', ');
    const { code, name } = computed.document;
    groups.set(key, { sources, formulas: [...(groups.get(key)?.formulas ?? []), { code, name }] });
  }
  const ordered = [...groups.entries()]
    .sort(([a, x], [b, y]) => x.sources.length - y.sources.length || (a < b ? -1 : 1))
    .map(([, group]) => group);
  return ordered.map((group, i) => {
    // a clean-down takes everything off, so only what came after the last one counts
    const before = new Set<string>();
    for (const earlier of ordered.slice(0, i)) {
      if ([...before].some((source) => !earlier.sources.includes(source))) before.clear();
      for (const source of earlier.sources) before.add(source);
    }
    return { ...group, cleanOf: [...before].filter((source) => !group.sources.includes(source)) };
  });
}

const sourcesOf = (computed: ComputedFormula, reference: Reference): readonly string[] =>
  [
    ...new Set([...materialIds(computed)].flatMap((id) => allergensOfMaterial(id, reference))),
  ].sort();

/** Names of the materials in use that come from tree nuts or peanut: what speaks against "nut-free" on shared equipment. */
export function nutSources(formulary: Formulary): readonly string[] {
  const ids = allergensMet(formulary)
    .filter(({ source }) => source === 'tree nuts' || source === 'peanut')
    .flatMap(({ materials }) => materials);
  return [...new Set(ids)].map((id) => nameOf(formulary.reference, id));
}
