import type {
  AdditiveRecord,
  AlkaliRecord,
  LiquidRecord,
} from '../../reference/material-records.ts';
import type { Reference } from '../../reference/reference.ts';
import type { ValueRecord } from '../../reference/values.ts';
import { words } from '../../words/catalogue.ts';
import { fixed } from '../../words/numbers.ts';

/** Anything with a page of its own under `materials/`: what has no page among the fats. */
export type SheetMaterial =
  | { readonly sort: 'alkali'; readonly record: AlkaliRecord }
  | { readonly sort: 'additive'; readonly record: AdditiveRecord }
  | { readonly sort: 'liquid'; readonly record: LiquidRecord };

/** Alkalis, then additives, then liquids, each in the order of the data. */
export function sheetMaterials({
  alkalis,
  additives,
  liquids,
}: Reference): readonly SheetMaterial[] {
  return [
    ...[...alkalis.values()].map((record) => ({ sort: 'alkali' as const, record })),
    ...[...additives.values()].map((record) => ({ sort: 'additive' as const, record })),
    ...[...liquids.values()].map((record) => ({ sort: 'liquid' as const, record })),
  ];
}

export interface MaterialValue {
  readonly what: string;
  readonly record: ValueRecord;
}

/** The published and stated values of a material, under names that people read. */
export function materialValues({ sort, record }: SheetMaterial): readonly MaterialValue[] {
  const { values } = words.materialPages;
  if (sort === 'alkali')
    return record.assays.map((assay) => ({ what: values.assay ?? '', record: assay }));
  return record.values.map(({ name, ...value }) => ({ what: values[name] ?? name, record: value }));
}

/** What kind of thing it is, in words: `alkali`, `clay`, `liquid`. */
export const kindOf = (material: SheetMaterial): string =>
  words.materialPages.kinds[material.sort === 'additive' ? material.record.kind : material.sort] ??
  material.sort;

/** How it is kept, by its kind; common practice. */
export const storageOf = (material: SheetMaterial): string => {
  const { storage } = words.materialPages;
  const own = material.sort === 'additive' ? storage[material.record.kind] : storage[material.sort];
  return own ?? storage.other ?? '';
};

/**
 * What the core reckons with: water, and the alkali that an acid takes, as pure sodium hydroxide per 100 g.
 * Empty for alkalis, which stand with their assay.
 */
export function reckonedWith(material: SheetMaterial, { constants }: Reference): readonly string[] {
  if (material.sort === 'alkali') return [];
  const { water, acidity } = material.record.core;
  const text = words.materialPages.reckoned;
  return [
    ...(water > 0 ? [text.water(fixed(100 * water, 1))] : []),
    ...(acidity > 0
      ? [text.acid(fixed(100 * acidity * constants.hydroxide.Na, 2))]
      : [text.neutral]),
  ];
}

/** Lists of the caution data that name the material, with their reason and basis. */
export const cautionsAbout = (id: string, { cautionThresholds }: Reference) =>
  Object.values(cautionThresholds.materials).filter(({ ids }) => ids.includes(id));
