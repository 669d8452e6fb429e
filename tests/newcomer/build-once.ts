import type { TestProject } from 'vitest/node';
import { buildSite } from '../support/build-site.ts';

/** Builds the invented shop of this folder once. */
export default (project: TestProject): (() => void) =>
  buildSite(project, ['--formulas', 'tests/newcomer/formulas', '--data', 'tests/newcomer/data']);
