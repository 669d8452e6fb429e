import { readdirSync, readFileSync, writeFileSync } from 'node:fs';
import { join, posix, relative, sep } from 'node:path';
import { fileURLToPath } from 'node:url';
import type { AstroIntegration } from 'astro';
import { SEAL_FILES } from '../../edition/seal-fs.ts';
import { measureStage } from '../../formulary/stages.ts';
import { EDITION_MARK } from '../common-input.ts';
import { siteInput } from '../input.ts';
import { idsOf, rewriteLinks } from './rewrite-links.ts';

/**
 * Turns the site-absolute links of the written pages and style sheets into relative ones, so that the
 * folder works at any address and from a disk, and puts the id of the edition in. Fails the build on a link to a file or an anchor that is not there.
 */
export function relativeLinks(): AstroIntegration {
  return {
    name: 'relative-links',
    hooks: {
      'astro:build:done': ({ dir }) => {
        const start = performance.now();
        const folder = fileURLToPath(dir);
        const files = filesIn(folder);
        // the seal is put on the finished folder
        const there = new Set([...files, ...SEAL_FILES]);
        // pages are read one after the other: all of them at once would fill the memory
        const read = (file: string) => readFileSync(join(folder, file), 'utf8');
        const ids = new Map<string, ReadonlySet<string>>();
        const idsOn = (page: string) => {
          const found = ids.get(page) ?? (isText(page) ? idsOf(read(page)) : NO_IDS);
          ids.set(page, found);
          return found;
        };
        const { edition } = siteInput();
        const dangling: string[] = [];
        for (const file of files.filter(isText)) {
          const text = read(file);
          const { rewritten, missing } = rewriteLinks(file, text, there, (page) =>
            page === file ? idsOf(text) : idsOn(page),
          );
          const finished = rewritten.replaceAll(EDITION_MARK, edition.id);
          dangling.push(...missing.map((link) => `${file}: ${link}`));
          if (finished !== text) writeFileSync(join(folder, file), finished);
        }
        if (dangling.length > 0) {
          throw new Error(`Links that lead nowhere:\n${dangling.join('\n')}`);
        }
        measureStage('links', start);
      },
    },
  };
}

const isText = (file: string) => /\.(html|css|svg)$/.test(file);
const NO_IDS: ReadonlySet<string> = new Set();

function filesIn(folder: string): string[] {
  return readdirSync(folder, { recursive: true, withFileTypes: true })
    .filter((entry) => entry.isFile())
    .map((entry) => relative(folder, join(entry.parentPath, entry.name)).split(sep).join(posix.sep))
    .sort();
}
