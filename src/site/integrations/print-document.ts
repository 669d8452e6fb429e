import { readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import type { AstroIntegration } from 'astro';
import { measureStage } from '../../formulary/stages.ts';
import { chapterHtml } from '../../handbook/book/chapter-html.ts';
import { bookParts } from '../../handbook/book/chapters.ts';
import { siteInput } from '../input.ts';

/**
 * Puts the written pages into `print.html`, each where its chapter stands empty, so that paper and screen say the
 * same. Goes before the links are made relative.
 */
export function printDocument(): AstroIntegration {
  return {
    name: 'print-document',
    hooks: {
      'astro:build:done': ({ dir }) => {
        const start = performance.now();
        const folder = fileURLToPath(dir);
        const file = join(folder, 'print.html');
        const chapters = new Map(
          bookParts(siteInput().formulary)
            .flatMap(({ chapters }) => chapters)
            .map((chapter) => [chapter.page, chapter] as const),
        );
        const document = readFileSync(file, 'utf8').replace(
          /(<article class="chapter" id="[^"]*" data-page="([^"]*)")><\/article>/g,
          (_, start: string, page: string) => {
            const chapter = chapters.get(page);
            if (!chapter) throw new Error(`print.html asks for ${page}, which is no chapter`);
            const html = readFileSync(join(folder, page), 'utf8');
            return `${start}>${chapterHtml(html, chapter, chapters)}</article>`;
          },
        );
        writeFileSync(file, document);
        measureStage('document', start);
      },
    },
  };
}
