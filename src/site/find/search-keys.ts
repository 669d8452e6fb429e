import type { ComputedFormula } from '../../formulary/formulary.ts';
import type { FindProperty } from '../../words/en/find.ts';
import { NUMBER_PROPERTIES } from './number-properties.ts';

/** Few: each costs every first search a number per formula. */
const SORTS: readonly FindProperty[] = ['superfat', 'iodine-value', 'revision'];

/** What the index can narrow and sort a formula's page by: Pagefind's attributes, and those that they name. */
export function searchKeys(computed: ComputedFormula): Readonly<Record<string, string>> {
  const { kind, process } = computed.document;
  const sorts = NUMBER_PROPERTIES.filter(({ id }) => SORTS.includes(id)).flatMap(
    ({ id, decimals, value }): readonly (readonly [string, string])[] => {
      const number = value(computed);
      return number === null ? [] : [[id, number.toFixed(decimals)]];
    },
  );
  return {
    ...named('filter', [
      ['kind', kind],
      ['process', process],
    ]),
    ...named('sort', sorts),
  };
}

/** One element can give several values only by naming attributes that hold them. */
const named = (use: 'filter' | 'sort', pairs: readonly (readonly [string, string])[]) => ({
  [`data-pagefind-${use}`]: pairs.map(([name]) => `${name}[data-${name}]`).join(', '),
  ...Object.fromEntries(pairs.map(([name, value]) => [`data-${name}`, value])),
});
