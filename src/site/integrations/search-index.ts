import { mkdirSync, readdirSync, readFileSync, writeFileSync } from 'node:fs';
import { dirname, join, posix, sep } from 'node:path';
import { fileURLToPath } from 'node:url';
import type { AstroIntegration } from 'astro';
import { measureStage } from '../../formulary/stages.ts';
import { buildSearch } from '../../search/build/build-search.ts';
import { siteInput } from '../input.ts';

/** Indexes the written pages that ask for it, and puts the index beside them as scripts. Goes after the links. */
export function searchIndex(): AstroIntegration {
  return {
    name: 'search-index',
    hooks: {
      'astro:build:done': async ({ dir }) => {
        const start = performance.now();
        const folder = fileURLToPath(dir);
        const pages = readdirSync(folder, { recursive: true, encoding: 'utf8' })
          .filter((path) => path.endsWith('.html'))
          .map((path) => ({
            path: path.split(sep).join(posix.sep),
            html: readFileSync(join(folder, path), 'utf8'),
          }))
          .filter(({ html }) => html.includes('data-pagefind-body'));
        const { formulas } = siteInput().formulary;
        const rows = formulas.map(({ document }) => `formulas/${document.code}.html`);
        const { files } = await buildSearch(pages, rows);
        for (const { path, text } of files) {
          const target = join(folder, 'search', path);
          mkdirSync(dirname(target), { recursive: true });
          writeFileSync(target, text);
        }
        measureStage('search', start);
      },
    },
  };
}
