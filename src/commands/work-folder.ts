import { randomUUID } from 'node:crypto';
import { mkdirSync, readdirSync, rmSync, statSync } from 'node:fs';
import { join } from 'node:path';

/** [ms] */
const DAY = 24 * 60 * 60 * 1000;

/**
 * A new folder for the pages while they are built. Astro runs its own output, which must lie where its packages
 * can be found, so it is below `project`. What killed builds have left there is cleared away.
 */
export function workFolder(project: string): string {
  const cache = join(project, '.cache');
  mkdirSync(cache, { recursive: true });
  for (const name of readdirSync(cache)) {
    const path = join(cache, name);
    const made = statSync(path, { throwIfNoEntry: false })?.mtimeMs ?? Date.now();
    // left by a build that was killed; no build takes a day
    if (name.startsWith('build-') && Date.now() - made > DAY) rmSync(path, { recursive: true });
  }
  // not mkdtemp: what becomes the published folder must be as readable as the user's other folders
  const folder = join(cache, `build-${randomUUID()}`);
  mkdirSync(folder);
  return folder;
}
