import type { Formula } from '../formulary/formula.ts';
import type { Reference } from '../reference/reference.ts';

/** Ids of the fats and alkalis that a formula weighs, the fat in its liquids among them. */
export function materialsUsed(formula: Formula, { liquids }: Reference): ReadonlySet<string> {
  return new Set([
    ...formula.fats.map(({ fat }) => fat),
    ...formula.afterCookFats.map(({ fat }) => fat),
    ...formula.liquids.flatMap(({ liquid }) => liquids.get(liquid)?.fat ?? []),
    ...(formula.alkali.sodium > 0 ? ['sodium-hydroxide'] : []),
    ...(formula.alkali.potassium > 0 ? ['potassium-hydroxide'] : []),
  ]);
}
