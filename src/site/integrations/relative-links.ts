import { readdirSync, readFileSync, writeFileSync } from 'node:fs';
import { join, posix, relative, sep } from 'node:path';
import { fileURLToPath } from 'node:url';
import type { AstroIntegration } from 'astro';
import { SEAL_FILES } from '../../edition/seal-fs.ts';
import { measureStage } from '../../formulary/stages.ts';
import { rewriteLinks } from './rewrite-links.ts';

/**
 * Turns the site-absolute links of the written pages and style sheets into relative ones, so that the
 * folder works at any address and from a disk. Fails the build on a link to a file or an anchor that is not there.
 */
export function relativeLinks(): AstroIntegration {
  return {
    name: 'relative-links',
    hooks: {
      'astro:build:done': ({ dir }) => {
        const start = performance.now();
        const folder = fileURLToPath(dir);
        const files = filesIn(folder);
        const texts = new Map(
          files
            .filter((file) => /\.(html|css|svg)$/.test(file))
            .map((file) => [file, readFileSync(join(folder, file), 'utf8')]),
        );
        // the seal is put on the finished folder
        const there = new Set([...files, ...SEAL_FILES]);
        const dangling: string[] = [];
        for (const [file, text] of texts) {
          const { rewritten, missing } = rewriteLinks(file, text, there, texts);
          dangling.push(...missing.map((link) => `${file}: ${link}`));
          if (rewritten !== text) writeFileSync(join(folder, file), rewritten);
        }
        if (dangling.length > 0) {
          throw new Error(`Links that lead nowhere:\n${dangling.join('\n')}`);
        }
        measureStage('links', start);
      },
    },
  };
}

function filesIn(folder: string): string[] {
  return readdirSync(folder, { recursive: true, withFileTypes: true })
    .filter((entry) => entry.isFile())
    .map((entry) => relative(folder, join(entry.parentPath, entry.name)).split(sep).join(posix.sep))
    .sort();
}
