import type { ComputedFormula } from '../../formulary/formulary.ts';
import { type BenchSheet, benchSheet } from '../../handbook/sheet.ts';
import type { Reference } from '../../reference/reference.ts';

/** What a sheet of any size prints that does not depend on the size. */
export interface SizeSheet
  extends Pick<BenchSheet, 'lots' | 'heat' | 'grave' | 'others' | 'days' | 'back'> {
  readonly notes: readonly string[];
}

/** Cautions that speak of one listed size; the limits behind them were held against the size itself. */
const OF_LISTED_SIZES = ['batch-too-small', 'batch-above-vessel', 'batch-above-heat-limit'];

/** The sheet of a formula without weights. Throws for a formula that has none at any listed size. */
export function sizeSheet(computed: ComputedFormula, reference: Reference): SizeSheet {
  const batch = computed.document.batches.find(({ refused }) => !refused);
  if (!batch) throw new RangeError(`${computed.document.code} has no weights`);
  const { lots, heat, grave, others, days, back, table } = benchSheet(computed, batch, reference);
  const ofAnySize = (cautions: typeof grave) =>
    cautions.filter(({ id }) => !OF_LISTED_SIZES.includes(id));
  return {
    lots,
    heat,
    grave: ofAnySize(grave),
    others: ofAnySize(others),
    days,
    back,
    notes: table.notes,
  };
}
