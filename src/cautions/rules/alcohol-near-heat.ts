import { materialNames } from '../material-names.ts';
import type { CautionRule } from '../rule.ts';

/** A flammable solvent in a soap that is cooked, or in a lye that heats itself. */
export const rule: CautionRule<'alcohol-near-heat'> = {
  id: 'alcohol-near-heat',
  severity: 'danger',
  basis: { materials: 'flammable' },
  applies: ({ formula, reference, thresholds }) => {
    const ids = formula.additives
      .filter(
        ({ additive, at }) =>
          thresholds.materials.flammable.ids.includes(additive) &&
          (formula.process === 'hot' || at === 'lye'),
      )
      .map(({ additive }) => additive);
    return ids.length > 0 ? [{ materials: materialNames(reference, ids) }] : [];
  },
};
