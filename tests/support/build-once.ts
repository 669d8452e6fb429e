import type { TestProject } from 'vitest/node';
import { buildSite } from './build-site.ts';

/** Builds the demo once. */
export default (project: TestProject): (() => void) => buildSite(project, []);
