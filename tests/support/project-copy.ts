import { execFileSync } from 'node:child_process';
import { cpSync, mkdirSync, readdirSync, symlinkSync } from 'node:fs';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';

const ROOT = fileURLToPath(new URL('../..', import.meta.url));
/** What a copy of the project does without: what a build leaves behind, and what is linked. */
const NOT_COPIED = ['node_modules', 'dist', 'tests'];

/** A copy of the project in a new folder, with nothing kept from earlier builds. */
export function copyProject(folder: string): void {
  mkdirSync(folder, { recursive: true });
  for (const part of readdirSync(ROOT)) {
    if (part.startsWith('.') || NOT_COPIED.includes(part)) continue;
    cpSync(join(ROOT, part), join(folder, part), { recursive: true });
  }
  symlinkSync(join(ROOT, 'node_modules'), join(folder, 'node_modules'), 'junction');
}

/** Builds with the program of a copy, as a user would. */
export function buildWithCopy(
  project: string,
  args: readonly string[],
  { env = {}, imports = [] }: BuildSurroundings = {},
): void {
  execFileSync(
    process.execPath,
    [...imports.flatMap((url) => ['--import', url]), 'src/commands/run.js', 'build', ...args],
    {
      cwd: project,
      // the test runner's own DEV and NODE_ENV go along: they must not reach the pages
      env: { ...process.env, ...env },
      stdio: ['ignore', 'ignore', 'pipe'],
    },
  );
}

export interface BuildSurroundings {
  readonly env?: Readonly<Record<string, string>>;
  /** Modules to load before the program, as URLs. */
  readonly imports?: readonly string[];
}
