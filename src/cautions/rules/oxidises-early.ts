import { materialNames } from '../material-names.ts';
import type { CautionContext, CautionRule } from '../rule.ts';

/** Many acids that oxygen attacks, by their share or by the oxidisability. */
export const rule: CautionRule<'oxidises-early'> = {
  id: 'oxidises-early',
  severity: 'care',
  basis: { limit: 'polyunsaturated' },
  applies: (context) => {
    const { profile } = context.document;
    if (!profile) return [];
    const { polyunsaturated, oxidisability } = profile;
    const { limits } = context.thresholds;
    const limit = limits.polyunsaturated.value;
    const oxidisabilityLimit = limits.oxidisability.value;
    if (polyunsaturated <= limit && oxidisability <= oxidisabilityLimit) return [];
    const protection = protectionOf(context);
    return [{ polyunsaturated, oxidisability, limit, oxidisabilityLimit, protection }];
  },
};

/** Antioxidants and chelators in use, by name; empty where there are none. */
function protectionOf({ formula, reference, thresholds }: CautionContext): string {
  const once = thresholds.materials['chelator-once-formed'].ids;
  const ids = formula.additives
    .map(({ additive }) => additive)
    .filter((id) => {
      const kind = reference.additives.get(id)?.kind;
      return kind === 'antioxidant' || kind === 'chelator' || once.includes(id);
    });
  return materialNames(reference, ids);
}
