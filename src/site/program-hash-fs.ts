import { createHash } from 'node:crypto';
import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';

/** What decides what pages look like, besides what they are made from: folders with all that is in them, and files. */
const FOLDERS = ['src'];
const FILES = ['astro.config.mjs', 'package.json', 'package-lock.json', 'tsconfig.json'];

/** Hash of the program in the folder `project`, of the packages it uses, and of the Node that runs it. */
export function programHash(project: string): string {
  const hash = createHash('sha256').update(process.version);
  const below = FOLDERS.flatMap((folder) =>
    readdirSync(join(project, folder), { recursive: true, withFileTypes: true })
      .filter((entry) => entry.isFile())
      .map((entry) => join(entry.parentPath, entry.name)),
  );
  for (const file of [...below.sort(), ...FILES.map((file) => join(project, file))]) {
    const bytes = readFileSync(file);
    hash.update(`${JSON.stringify(file.slice(project.length))} ${bytes.length}\n`).update(bytes);
  }
  return hash.digest('hex');
}
