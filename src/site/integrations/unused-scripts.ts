import { readdirSync, readFileSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import type { AstroIntegration } from 'astro';

/** Where a page asks for a script. */
const ASSET = /assets\/([^"'/?#]+\.js)/g;

/** Takes out the scripts that no page and no worker asks for: those of what the shop has not turned on. */
export function unusedScripts(): AstroIntegration {
  return {
    name: 'unused-scripts',
    hooks: {
      'astro:build:done': ({ dir }) => {
        const folder = fileURLToPath(dir);
        const assets = join(folder, 'assets');
        const unused = new Set(readdirSync(assets).filter((file) => file.endsWith('.js')));
        for (const path of readdirSync(folder, { recursive: true, encoding: 'utf8' })) {
          if (!path.endsWith('.html') && path !== 'kept-copy-worker.js') continue;
          for (const [, name = ''] of readFileSync(join(folder, path), 'utf8').matchAll(ASSET)) {
            unused.delete(name);
          }
        }
        for (const name of unused) rmSync(join(assets, name));
      },
    },
  };
}
