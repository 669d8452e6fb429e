import type { BatchDocument, FormulaDocument } from '../formulary/document.ts';
import type { Reference } from '../reference/reference.ts';
import { words } from '../words/catalogue.ts';
import { decimalsOf, weight } from '../words/numbers.ts';
import { nameOf } from './names.ts';

/** One thing to weigh, as it is printed. */
export interface WeightLine {
  readonly id: string;
  readonly name: string;
  /** To the scale's step, without unit. */
  readonly text: string;
  /** Lot that the weight was reckoned for, where a lot decides. */
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
}

const ORDER: readonly GroupName[] = ['lye', 'fats', 'trace', 'after-cook', 'dilution'];

/**
 * The weights of one batch in working order: alkali and water and what joins them, then fats, then what
 * comes at trace, after the cook and at dilution. Empty groups are left out. Held-back water stands with
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

  for (const { id, weighedMass, step } of batch.alkali) {
    const line = document.alkali.find((alkali) => alkali.id === id);
    const name = nameOf(reference, id);
    put(
      'lye',
      {
        id,
        name: line?.form === 'solution' ? words.formulaPage.stock(name) : name,
        lot: line?.assay.lot ?? null,
      },
      weighedMass,
      step,
    );
  }
  const heldBack = batch.weighedHeldBack ?? 0;
  if (batch.weighedWater !== null) {
    const water = { id: 'water', name: words.formulaPage.batch.water, lot: null };
    put('lye', water, batch.weighedWater - heldBack, batch.waterStep);
  }
  for (const { id, weighedMass, step } of batch.fats) {
    const lot = document.fats.find((fat) => fat.id === id)?.saponificationValue.lot ?? null;
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

  return {
    groups: ORDER.flatMap((name) => {
      const group = lines.get(name) ?? [];
      if (group.length === 0) return [];
      return [{ name, title: words.formulaPage.batch.groups[name] ?? name, lines: group }];
    }),
    decimals: Math.max(0, ...[...steps].map(decimalsOf)),
    steps: [...steps].sort((a, b) => a - b),
  };
}
