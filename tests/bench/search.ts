/**
 * Speed and size of the find page with many formulas, in Chromium over http and from a disk:
 * `node tests/bench/search.ts [built site] [formulas]`. The site's own formula pages are multiplied under other codes
 * and names, so the pages are as long as real ones; the finder's rows are theirs, moved a little.
 */
import {
  cpSync,
  mkdirSync,
  mkdtempSync,
  readFileSync,
  rmSync,
  statSync,
  writeFileSync,
} from 'node:fs';
import { tmpdir } from 'node:os';
import { dirname, join } from 'node:path';
import { pathToFileURL } from 'node:url';
import { gzipSync } from 'node:zlib';
import { buildSearch } from '../../src/search/build/build-search.ts';
import type { FinderData } from '../../src/search/finder/finder-data.ts';
import { launch } from '../browser/launch.ts';
import { serve } from '../browser/serve.ts';
import { chance } from '../search/chance.ts';
import { WORDS } from '../search/synthetic-pages.ts';
import { sitePages } from '../support/site-files.ts';
import { measureFinder } from './measure-finder.ts';

const [site = 'dist', formulas = '5000'] = process.argv.slice(2);
const count = Number(formulas);
const random = chance(12);
const folder = mkdtempSync(join(tmpdir(), 'find-'));

const finder: FinderData = JSON.parse(
  readFileSync(join(site, 'search/finder.js'), 'utf8')
    .replace(/^[^{]*/, '')
    .replace(/;\s*$/, ''),
);
const indexed = sitePages(site)
  .map((path) => ({ path, html: readFileSync(join(site, path), 'utf8') }))
  .filter(({ html }) => html.includes('data-pagefind-body'));
const formulaPages = indexed.filter(({ path }) => path.startsWith('formulas/'));
const rows = Array.from({ length: count }, (_, i) => {
  const from = i % formulaPages.length;
  const name = `${random.pick(WORDS)} ${random.pick(WORDS)}`.replace(/[<&]/g, '');
  return { from, name, code: `QY-${String(i).padStart(5, '0')}` };
});
const copies = rows.map(({ from, name, code }) => ({
  path: `formulas/${code}.html`,
  html: (formulaPages[from]?.html ?? '')
    .replaceAll(finder.codes[from] ?? '', code)
    .replaceAll(finder.names[from] ?? '', name),
}));

const many: FinderData = {
  codes: rows.map(({ code }) => code),
  names: rows.map(({ name }) => name),
  properties: finder.properties.map((property) => ({
    ...property,
    values: rows.map(({ from }) => {
      const value = property.values[from] ?? null;
      const moved = value === null ? null : value * (0.8 + random.below(400) / 1000);
      return moved === null ? null : Number(moved.toFixed(property.decimals));
    }),
  })),
  traits: finder.traits.map((trait) => ({
    ...trait,
    members: rows.map(({ from }) => trait.members[from] ?? []),
  })),
};

const started = performance.now();
const others = indexed.filter(({ path }) => !path.startsWith('formulas/'));
const { files } = await buildSearch(
  [...others, ...copies],
  copies.map(({ path }) => path),
);
const seconds = (performance.now() - started) / 1000;

for (const part of ['find.html', 'assets', 'mark.svg']) {
  cpSync(join(site, part), join(folder, part), { recursive: true });
}
const data = `self.handbookFinder=${JSON.stringify(many)};\n`;
for (const { path, text } of [...files, { path: 'finder.js', text: data }]) {
  mkdirSync(dirname(join(folder, 'search', path)), { recursive: true });
  writeFileSync(join(folder, 'search', path), text);
}

const perValue = gzipSync(data).length / count / many.properties.length;
console.log(
  `${count} formulas, ${copies.length + others.length} pages indexed and read back in ${seconds.toFixed(1)} s`,
);
console.log(
  `finder data: ${perValue.toFixed(1)} bytes per formula and property, compressed (at most 60)`,
);
for (const script of scriptsOf(join(site, 'find.html'))) {
  const size = gzipSync(readFileSync(join(site, script))).length;
  console.log(`${script}: ${(size / 1000).toFixed(1)} kB compressed (at most 20)`);
}

const browser = await launch();
const server = await serve(folder, '/');
try {
  for (const [where, base] of [
    ['http', server.origin],
    ['file', `${pathToFileURL(folder).href}/`],
  ] as const) {
    const sizeOf = (path: string) => statSync(join(folder, path)).size;
    for (const line of await measureFinder(browser, base, sizeOf)) console.log(`${where}: ${line}`);
  }
} finally {
  await browser.close();
  await server.close();
  rmSync(folder, { recursive: true });
}

function scriptsOf(page: string): readonly string[] {
  return [...readFileSync(page, 'utf8').matchAll(/<script[^>]*src="(assets[^"]*)"/g)].map(
    ([, path = '']) => path,
  );
}
