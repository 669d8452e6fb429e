import type { Constants } from './constants.ts';
import type { Fat, Stage } from './materials.ts';
import { type MgKohPerGram, type MolesPerGram, molesPerGram, type Range } from './quantity.ts';

/**
 * Saponifiable equivalents of one gram of fat: e = S / (1000 M(KOH)). [mol/g]
 * @example equivalentsPerGram(mgKohPerGram(190), constants) // 0.0033865 mol/g
 */
export function equivalentsPerGram(value: MgKohPerGram, constants: Constants): MolesPerGram {
  return molesPerGram(value / (1000 * constants.hydroxide.K));
}

/** Which of a fat's values is meant. */
export type End = 'value' | 'low' | 'middle' | 'high';

/**
 * What a fat is sure to take up, as a range. [mg KOH/g]
 *
 * With `waxAsAcids`, a wax counts only its acid value: in cold process its esters may not react at all.
 */
export const rangeThatCounts = (fat: Fat, waxAsAcids: boolean): Range<MgKohPerGram> =>
  waxAsAcids && fat.kind === 'wax' ? fat.acidValue : fat.saponificationValue;

/** The same at one end of the range. [mg KOH/g] */
export function valueAt(fat: Fat, end: End, waxAsAcids: boolean): MgKohPerGram {
  const range = rangeThatCounts(fat, waxAsAcids);
  return end === 'middle' ? (((range.low + range.high) / 2) as MgKohPerGram) : range[end];
}

/** Whether what joins at a stage is there when the alkali does its work. */
export const isBeforeSaponification = (stage: Stage): boolean =>
  stage === 'lye' || stage === 'fats' || stage === 'trace';
