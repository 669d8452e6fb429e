import { lotsInForce } from '../edition/weights-digest.ts';
import type { ComputedFormula, Formulary } from '../formulary/formulary.ts';
import type { Reference } from '../reference/reference.ts';
import { nameOf } from './names.ts';

export interface TableLot {
  readonly material: string;
  readonly name: string;
  readonly lot: string;
  readonly retestBy: string;
}

/** The lots that a printed table was reckoned for, and how long it may hang. */
export interface TableLots {
  /** Alkali first, then by name. */
  readonly lots: readonly TableLot[];
  /** Names of what has no lot and is reckoned on its published range. */
  readonly without: readonly string[];
  /** The earliest day of retest among the lots, the last on which the table holds; `null` without lots. */
  readonly until: string | null;
}

/** Of all formulas that are made at one size. */
export function lotsOfSize({ reference, formulas }: Formulary, batchId: string): TableLots {
  return lotsOf(
    formulas.filter(({ document }) =>
      document.batches.some(({ id, refused }) => id === batchId && !refused),
    ),
    reference,
  );
}

/** Of every fat and alkali that the shop has a lot of. */
export function lotsOfShop(reference: Reference): TableLots {
  const materials = [
    ...reference.lots.alkalis.map(({ alkali, lot, status }) => ({ material: alkali, lot, status })),
    ...reference.lots.fats.map(({ fat, lot, status }) => ({ material: fat, lot, status })),
  ];
  return tableLots(
    materials.filter(({ status }) => status === 'released'),
    [],
    reference,
  );
}

function lotsOf(formulas: readonly ComputedFormula[], reference: Reference): TableLots {
  const inForce = formulas.flatMap(({ formula }) => lotsInForce(formula, reference));
  const used = formulas.flatMap(({ document }) =>
    [...document.alkali, ...document.fats, ...document.afterCookFats].map(({ id }) => id),
  );
  return tableLots(inForce, used, reference);
}

function tableLots(
  inForce: readonly { readonly material: string; readonly lot: string }[],
  used: readonly string[],
  reference: Reference,
): TableLots {
  const each = new Map(inForce.map((entry) => [entry.material, entry]));
  const isAlkali = (id: string) => reference.lots.alkalis.some(({ alkali }) => alkali === id);
  const lots = [...each.values()]
    .map(({ material, lot }) => ({
      material,
      name: nameOf(reference, material),
      lot,
      retestBy: retestOf(material, lot, reference),
    }))
    .sort(
      (a, b) =>
        Number(isAlkali(b.material)) - Number(isAlkali(a.material)) || (a.name < b.name ? -1 : 1),
    );
  return {
    lots,
    without: [...new Set(used.filter((id) => !each.has(id)))]
      .map((id) => nameOf(reference, id))
      .sort(),
    until: lots.map(({ retestBy }) => retestBy).sort()[0] ?? null,
  };
}

function retestOf(material: string, lot: string, { lots }: Reference): string {
  const record =
    lots.alkalis.find((each) => each.alkali === material && each.lot === lot) ??
    lots.fats.find((each) => each.fat === material && each.lot === lot);
  if (!record) throw new Error(`No lot ${lot} of ${material}`);
  return record.retestBy;
}
