import { interpolate } from '../../chemistry/interpolate.ts';
import { words } from '../../words/catalogue.ts';
import { materialNames } from '../material-names.ts';
import type { CautionRule } from '../rule.ts';

/** A stock lye whose strength the table of first crystals covers. Outside it `stock-lye` warns without a number. */
export const rule: CautionRule<'stock-crystallises'> = {
  id: 'stock-crystallises',
  severity: 'care',
  basis: { table: 'crystallisation' },
  applies: ({ document, charge, reference }) =>
    charge.alkali.flatMap(({ supply: { id, form, cation, assay } }) => {
      if (form !== 'solution') return [];
      const crystals = interpolate(reference.tables.crystallisation[cation], assay.value * 100);
      if (crystals === null) return [];
      const lot = document.alkali.find((line) => line.id === id)?.assay.lot ?? '';
      const set = reference.tables.sets.crystallisation.find(
        ({ used, solute }) => used && solute === id,
      );
      const how = set ? words.frame.how[set.how] : '';
      const name = materialNames(reference, [id]);
      return [{ name, lot, assay: assay.value * 100, crystals, how }];
    }),
};
