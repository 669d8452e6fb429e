import { COMMON_PRACTICE } from '../../reference/caution-thresholds.ts';
import { allergenName } from '../../words/allergen-name.ts';
import { materialNames } from '../material-names.ts';
import type { CautionContext, CautionRule } from '../rule.ts';

/** Materials that the data mark as coming from a known source of allergens. */
export const rule: CautionRule<'allergen-sources'> = {
  id: 'allergen-sources',
  severity: 'care',
  basis: COMMON_PRACTICE,
  applies: (context) => {
    const bySource = new Map<string, string[]>();
    for (const { id, allergens } of recordsOf(context)) {
      for (const source of allergens) {
        bySource.set(source, [...(bySource.get(source) ?? []), id]);
      }
    }
    if (bySource.size === 0) return [];
    const sources = [...bySource].map(
      ([source, ids]) => `${allergenName(source)} (${materialNames(context.reference, ids)})`,
    );
    return [{ sources: sources.join('; ') }];
  },
};

/** Everything in the formula that the data know allergens of, the fat inside a liquid by the liquid. */
function recordsOf({ formula, reference }: CautionContext) {
  return [
    ...[...formula.fats, ...formula.afterCookFats].map(({ fat }) => reference.fats.get(fat)),
    ...formula.liquids.map(({ liquid }) => reference.liquids.get(liquid)),
    ...formula.additives.map(({ additive }) => reference.additives.get(additive)),
  ].filter((record) => record !== undefined);
}
