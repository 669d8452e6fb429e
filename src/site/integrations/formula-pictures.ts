import { copyFileSync, mkdirSync, readFileSync } from 'node:fs';
import { dirname, extname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import type { AstroIntegration } from 'astro';
import { picturesOf } from '../../handbook/method-html.ts';
import { siteInput } from '../input.ts';

const TYPES: Readonly<Record<string, string>> = {
  '.jpg': 'image/jpeg',
  '.jpeg': 'image/jpeg',
  '.png': 'image/png',
  '.webp': 'image/webp',
};

/** Brings the pictures that formula texts show beside their pages; nothing else of the formulas folder. */
export function formulaPictures(): AstroIntegration {
  return {
    name: 'formula-pictures',
    hooks: {
      'astro:build:done': ({ dir }) => {
        const { formulasFolder } = siteInput();
        for (const picture of pictures()) {
          const target = join(fileURLToPath(dir), 'formulas', picture);
          mkdirSync(dirname(target), { recursive: true });
          copyFileSync(join(formulasFolder, picture), target);
        }
      },
      'astro:server:setup': ({ server }) => {
        server.middlewares.use('/formulas', (request, response, next) => {
          const name = (request.url ?? '').slice(1).replace(/\?.*$/, '');
          if (!pictures().has(name)) {
            next();
            return;
          }
          response.writeHead(200, { 'Content-Type': TYPES[extname(name).toLowerCase()] });
          response.end(readFileSync(join(siteInput().formulasFolder, name)));
        });
      },
    },
  };
}

function pictures(): ReadonlySet<string> {
  const { formulas } = siteInput().formulary;
  return new Set(formulas.flatMap(({ formula }) => picturesOf(formula)));
}
