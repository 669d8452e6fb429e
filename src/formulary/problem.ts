export type { Problem } from '../reference/problem.ts';
