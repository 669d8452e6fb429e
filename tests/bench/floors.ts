import { mkdirSync, readdirSync, readFileSync, rmSync, symlinkSync, writeFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { performance } from 'node:perf_hooks';
import { fileURLToPath } from 'node:url';
import { type Measured, measureNode } from './formulary-build.ts';

const MODULES = fileURLToPath(new URL('../../node_modules', import.meta.url));

/** How long it takes to write all files of a built site from memory into a new folder. [s] */
export function writingFloor(site: string, folder: string): number {
  const files = filesIn(site).map((path) => ({ path, bytes: readFileSync(join(site, path)) }));
  const start = performance.now();
  for (const { path, bytes } of files) {
    mkdirSync(dirname(join(folder, path)), { recursive: true });
    writeFileSync(join(folder, path), bytes);
  }
  const seconds = (performance.now() - start) / 1000;
  rmSync(folder, { recursive: true });
  return seconds;
}

const CONFIG = `import { defineConfig } from 'astro/config';
export default defineConfig({
  compressHTML: true,
  build: { format: 'preserve', assets: 'assets', inlineStylesheets: 'never' },
  devToolbar: { enabled: false },
});
`;

const page = (site: string) => `---
import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';

export function getStaticPaths() {
  // it is taken out of here, without what stands beside it
  const site = ${JSON.stringify(site)};
  return readdirSync(site, { recursive: true, encoding: 'utf8' })
    .filter((path) => path.endsWith('.html') && path !== 'print.html')
    .map((path) => ({
      // an index would stand for its folder
      params: { path: path.replaceAll('\\\\', '/').replace(/\\.html$/, '-page') },
      props: { html: readFileSync(join(site, path), 'utf8') },
    }));
}

const { html } = Astro.props;
---
<Fragment set:html={html} />
`;

const BUILD = `import { build } from 'astro';
await build({ root: process.cwd(), logLevel: 'error' });
`;

/**
 * How long the framework takes for as many pages of the same sizes from ready strings, with the options that the
 * handbook has: all pages of a built site but the document to print, which is no page of the framework's either.
 */
export async function frameworkFloor(site: string, folder: string): Promise<Measured> {
  const pages = join(folder, 'src', 'pages');
  mkdirSync(pages, { recursive: true });
  writeFileSync(join(folder, 'package.json'), '{ "type": "module", "private": true }\n');
  writeFileSync(join(folder, 'astro.config.mjs'), CONFIG);
  writeFileSync(join(folder, 'build.mjs'), BUILD);
  writeFileSync(join(pages, '[...path].astro'), page(site));
  symlinkSync(MODULES, join(folder, 'node_modules'), 'junction');
  const measured = await measureNode(folder, ['build.mjs'], join(folder, 'watch'));
  const made = filesIn(join(folder, 'dist')).length;
  const asked = filesIn(site).filter((path) => path.endsWith('.html')).length - 1;
  if (made !== asked) throw new Error(`the framework made ${made} pages, not ${asked}`);
  rmSync(folder, { recursive: true });
  return measured;
}

const filesIn = (folder: string): readonly string[] =>
  readdirSync(folder, { recursive: true, withFileTypes: true })
    .filter((entry) => entry.isFile())
    .map((entry) => join(entry.parentPath, entry.name).slice(folder.length + 1));
