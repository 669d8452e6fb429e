/** Defined where the first reader of files needs it; named here for all that come after. */
export type { Problem } from '../reference/problem.ts';
