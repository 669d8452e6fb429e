import { named, sign, sub, variable } from './mathml.ts';

/** Short names for what the equations are written with: letters, indices, operators. */
export const v = variable;
export const at = (base: string, index: string) => sub(v(base), v(index));
export const of = (base: string, index: string) => sub(v(base), named(index));
export const minus = sign('−');
export const plus = sign('+');
export const times = sign('·');
export const koh = of('M', 'KOH');
