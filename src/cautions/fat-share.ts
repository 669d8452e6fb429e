import type { Fat } from '../chemistry/materials.ts';
import type { CautionContext } from './rule.ts';

/** Which fats of a formula pass a test, and their share together. [percent of the fats of the alkali] */
export function fatShare(
  { charge }: Pick<CautionContext, 'charge'>,
  test: (fat: Fat) => boolean,
): { readonly ids: readonly string[]; readonly share: number } {
  const total = charge.fats.reduce((sum, { mass }) => sum + mass, 0);
  const found = charge.fats.filter(({ fat }) => test(fat));
  const mass = found.reduce((sum, { mass }) => sum + mass, 0);
  // the last bits of a sum must not decide on which side of a limit a share stands
  return { ids: found.map(({ fat }) => fat.id), share: Number(((100 * mass) / total).toFixed(9)) };
}
