import type { BatchDocument, FormulaDocument } from '../formulary/document.ts';
import type { Reference } from '../reference/reference.ts';
import { words } from '../words/catalogue.ts';
import { stepDecimals, weight } from '../words/measures.ts';
import { nameOf } from './names.ts';

/** One thing to weigh, as it is printed. */
export interface WeightLine {
  readonly id: string;
  readonly name: string;
  /** To the scale's step, without the unit that it ends in. */
  readonly text: string;
  /** Lot that the weight was reckoned for, where a lot decides; of a blend the lots of its parts. */
  readonly lot: string | null;
}

export type GroupName = 'lye' | 'fats' | 'trace' | 'after-cook' | 'dilution';

export interface WeightGroup {
  readonly name: GroupName;
  readonly title: string;
  readonly lines: readonly WeightLine[];
}

/** A batch as a table of groups in working order. */
export interface WeightsTable {
  readonly groups: readonly WeightGroup[];
  /** Most digits after the point in any line, so that the column can align on it. */
  readonly decimals: number;
  readonly steps: readonly number[];
  /** What a reader must know of the lines: what a blend is of, what a stock lye brings. */
  readonly notes: readonly string[];
}

const ORDER: readonly GroupName[] = ['lye', 'fats', 'trace', 'after-cook', 'dilution'];

/**
 * The weights of one batch in working order: water, what is dissolved in it and the alkali last, then fats,
 * then what comes at trace, after the cook and at dilution. Empty groups are left out. Held-back water stands with
 * the things at trace; `weighedWater` counts it, so the lye line is the rest.
 */
export function weightsTable(
  document: FormulaDocument,
  batch: BatchDocument,
  reference: Reference,
): WeightsTable {
  const lines = new Map<GroupName, WeightLine[]>(ORDER.map((name) => [name, []]));
  const steps = new Set<number>();
  const put = (group: string, line: Omit<WeightLine, 'text'>, mass: number, step: number) => {
    const list = lines.get(group as GroupName);
    if (!list) throw new Error(`Unknown stage ${group} of ${line.id} in ${document.code}`);
    steps.add(step);
    list.push({ ...line, text: weight(mass, step) });
  };

  const fromStock = batch.alkali.some(({ id }) => stockOf(document, id));
  const heldBack = batch.weighedHeldBack ?? 0;
  if (batch.weighedWater !== null) {
    const { water: all, waterBesideStock } = words.formulaPage.batch;
    const water = { id: 'water', name: fromStock ? waterBesideStock : all, lot: null };
    put('lye', water, batch.weighedWater - heldBack, batch.waterStep);
  }
  for (const { id, weighedMass, step } of batch.fats) {
    const lot = reference.blends.has(id)
      ? blendLots(document, id, reference)
      : (document.fats.find((fat) => fat.id === id)?.saponificationValue.lot ?? null);
    put('fats', { id, name: nameOf(reference, id), lot }, weighedMass, step);
  }
  if (heldBack > 0) {
    const line = { id: 'held-back', name: words.formulaPage.batch.waterHeldBack, lot: null };
    put('trace', line, heldBack, batch.heldBackStep);
  }
  for (const { id, weighedMass, step } of batch.afterCookFats) {
    put('after-cook', { id, name: nameOf(reference, id), lot: null }, weighedMass, step);
  }
  for (const { id, weighedMass, step, at } of [...batch.liquids, ...batch.additives]) {
    put(at, { id, name: nameOf(reference, id), lot: null }, weighedMass, step);
  }

  // alkali goes into water, so it stands below everything that is in the jug before it
  for (const { id, weighedMass, step } of batch.alkali) {
    const lot = document.alkali.find((alkali) => alkali.id === id)?.assay.lot ?? null;
    put('lye', { id, name: alkaliName(document, id, reference), lot }, weighedMass, step);
  }

  return {
    groups: ORDER.flatMap((name) => {
      const group = lines.get(name) ?? [];
      if (group.length === 0) return [];
      return [{ name, title: words.formulaPage.batch.groups[name] ?? name, lines: group }];
    }),
    decimals: Math.max(0, ...[...steps].map(stepDecimals)),
    steps: [...steps].sort((a, b) => a - b),
    notes: [
      ...batch.alkali.flatMap(({ id }) =>
        stockOf(document, id) ? [words.formulaPage.stockNote(nameOf(reference, id))] : [],
      ),
      ...batch.fats.flatMap(({ id }) => blendNote(id, reference)),
    ],
  };
}

const stockOf = ({ alkali }: Pick<FormulaDocument, 'alkali'>, id: string) =>
  alkali.find((line) => line.id === id && line.form === 'solution');

/** An alkali as it stands on a sheet: a stock lye says what it is and how strong, so that nobody weighs solid. */
export function alkaliName(
  document: Pick<FormulaDocument, 'alkali'>,
  id: string,
  reference: Reference,
): string {
  const name = nameOf(reference, id);
  const stock = stockOf(document, id);
  return stock ? words.formulaPage.stock(name, stock.assay.value) : name;
}

/** The lots of a blend's parts, each with its fat, for the tub has a number of its own. */
function blendLots({ fats }: FormulaDocument, id: string, reference: Reference): string | null {
  const lots = fats.flatMap(({ id: fat, blend, saponificationValue: { lot } }) =>
    blend === id && lot ? [words.formulaPage.lotOf(lot, nameOf(reference, fat))] : [],
  );
  return lots.length === 0 ? null : lots.join(', ');
}

/** What a blend is mixed from, so that its tub can be held against the sheet. */
function blendNote(id: string, reference: Reference): readonly string[] {
  const blend = reference.blends.get(id);
  if (!blend) return [];
  const parts = blend.parts.map(({ fat, share }) => ({ name: nameOf(reference, fat), share }));
  return [words.formulaPage.blendNote(blend.name, parts)];
}
