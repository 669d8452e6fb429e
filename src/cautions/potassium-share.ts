import type { Charge } from '../chemistry/charge.ts';

/** How much of the hydroxide, by amount, is potassium hydroxide. [%] */
export function potassiumShare({ alkali }: Pick<Charge, 'alkali'>): number {
  let potassium = 0;
  let all = 0;
  for (const { supply, moles } of alkali) {
    all += moles;
    if (supply.cation === 'K') potassium += moles;
  }
  return 100 * (potassium / all);
}
