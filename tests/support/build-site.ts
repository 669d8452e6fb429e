import { execFileSync } from 'node:child_process';
import { mkdirSync, mkdtempSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import type { TestProject } from 'vitest/node';

declare module 'vitest' {
  interface ProvidedContext {
    /** The folder that holds the one build that the tests of a project share. */
    site: string;
  }
}

const ROOT = fileURLToPath(new URL('../..', import.meta.url));

/** Builds a site by the command that a user types, into a folder of its own. Gives what removes it again. */
export function buildSite(project: TestProject, shop: readonly string[]): () => void {
  const cache = join(ROOT, '.cache');
  mkdirSync(cache, { recursive: true });
  const folder = mkdtempSync(join(cache, 'test-site-'));
  const site = join(folder, 'dist');
  execFileSync('npm', ['run', '--silent', 'build', '--', ...shop, '--out', site], {
    cwd: ROOT,
    stdio: ['ignore', 'ignore', 'inherit'],
    env: userEnvironment(),
    shell: process.platform === 'win32',
  });
  project.provide('site', site);
  return () => rmSync(folder, { recursive: true, force: true });
}

/** The environment of a user: what the test runner adds would make Astro build for tests. */
function userEnvironment(): NodeJS.ProcessEnv {
  const isOurs = (name: string) => name === 'NODE_ENV' || /^(VITE|VITEST)(_|$)/.test(name);
  return Object.fromEntries(Object.entries(process.env).filter(([name]) => !isOurs(name)));
}
