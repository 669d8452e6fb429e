import type { AnySizeData } from '../../src/browser/any-size-data.ts';
import { loadEdition } from '../../src/edition/load-edition-fs.ts';
import type { ComputedFormula } from '../../src/formulary/formulary.ts';
import type { Reference } from '../../src/reference/reference.ts';
import { anySizeData } from '../../src/site/any-size/any-size-data.ts';

/** The demonstration's formulas with what their pages' scripts get, as it comes out of a data file. */
export function demoOffers(): {
  readonly reference: Reference;
  readonly formulas: readonly ComputedFormula[];
  readonly offers: readonly { readonly computed: ComputedFormula; readonly data: AnySizeData }[];
} {
  const loaded = loadEdition({ formulas: 'formulas', data: 'data' }, { asOf: '2026-12-01' });
  if (!loaded.ok) throw new Error(JSON.stringify(loaded.problems));
  const { formulas, reference } = loaded.edition.formulary;
  const offers = formulas.flatMap((computed) => {
    const data: AnySizeData | null = JSON.parse(JSON.stringify(anySizeData(computed, reference)));
    return data ? [{ computed, data }] : [];
  });
  return { reference, formulas, offers };
}
