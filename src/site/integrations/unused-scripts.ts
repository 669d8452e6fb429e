import { readdirSync, readFileSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import type { AstroIntegration } from 'astro';

/** Takes out the scripts that no page and no worker asks for: those of what the shop has not turned on. */
export function unusedScripts(): AstroIntegration {
  return {
    name: 'unused-scripts',
    hooks: {
      'astro:build:done': ({ dir }) => {
        const folder = fileURLToPath(dir);
        const pages = readdirSync(folder, { recursive: true, encoding: 'utf8' })
          .filter((path) => path.endsWith('.html') || path === 'kept-copy-worker.js')
          .map((path) => readFileSync(join(folder, path), 'utf8'));
        const assets = join(folder, 'assets');
        for (const name of readdirSync(assets).filter((file) => file.endsWith('.js'))) {
          if (!pages.some((page) => page.includes(`assets/${name}`))) rmSync(join(assets, name));
        }
      },
    },
  };
}
