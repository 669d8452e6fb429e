import { mkdirSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import type { AstroIntegration } from 'astro';
import { measureStage } from '../../formulary/stages.ts';
import { type CardContent, cardContent } from '../../handbook/card-content.ts';
import { cardFiles } from '../../handbook/card-files-fs.ts';
import { pruneKept } from '../../handbook/kept-files-fs.ts';
import { type SiteInput, siteInput } from '../input.ts';

/** A card that no build has asked for in so many days is of a formula that has changed since. */
const LONGEST_UNUSED = 60;

/** Puts the bench card of every batch that has weights beside the pages, as SVG and PNG. */
export function benchCards(): AstroIntegration {
  let cache = '';
  return {
    name: 'bench-cards',
    hooks: {
      'astro:config:done': ({ config }) => {
        cache = fileURLToPath(new URL('.cache/cards', config.root));
      },
      'astro:build:done': async ({ dir }) => {
        const start = performance.now();
        const folder = join(fileURLToPath(dir), 'cards');
        mkdirSync(folder, { recursive: true });
        for (const [name, content] of benchCardContents(siteInput())) {
          const { svg, png } = await cardFiles(content, cache);
          writeFileSync(join(folder, `${name}.svg`), svg);
          writeFileSync(join(folder, `${name}.png`), png);
        }
        pruneKept(cache, LONGEST_UNUSED, Date.now());
        measureStage('cards', start);
      },
      'astro:server:setup': ({ server }) => {
        server.middlewares.use('/cards', (request, response, next) => {
          const [, name, type] = /^\/([^/?]+)\.(svg|png)/.exec(request.url ?? '') ?? [];
          const content = benchCardContents(siteInput()).get(name ?? '');
          if (!content) {
            next();
            return;
          }
          cardFiles(content, cache).then(({ svg, png }) => {
            response.writeHead(200, {
              'Content-Type': type === 'svg' ? 'image/svg+xml' : 'image/png',
            });
            response.end(type === 'svg' ? svg : png);
          }, next);
        });
      },
    },
  };
}

/** By their names, `QY-001-pilot`. */
export function benchCardContents({
  formulary,
  asOf,
}: Pick<SiteInput, 'formulary' | 'asOf'>): ReadonlyMap<string, CardContent> {
  return new Map(
    formulary.formulas.flatMap((computed) =>
      computed.document.batches.flatMap((batch) => {
        const content = cardContent(computed, batch, formulary.reference, asOf);
        return content ? [[`${computed.document.code}-${batch.id}`, content] as const] : [];
      }),
    ),
  );
}
