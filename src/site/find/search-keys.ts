import type { ComputedFormula } from '../../formulary/formulary.ts';

/**
 * What the index can narrow a formula's page by: Pagefind's attribute, and those that it names. There are no orders:
 * each would cost every first search a number per formula, and the finder sorts by its own data.
 */
export function searchKeys({ document }: ComputedFormula): Readonly<Record<string, string>> {
  // one element can give several values only by naming attributes that hold them
  return {
    'data-pagefind-filter': 'kind[data-kind], process[data-process]',
    'data-kind': document.kind,
    'data-process': document.process,
  };
}
