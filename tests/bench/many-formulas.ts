import { cpSync, mkdirSync, mkdtempSync, readFileSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { dirname, join } from 'node:path';
import { buildSearch } from '../../src/search/build/build-search.ts';
import type { FinderData } from '../../src/search/finder/finder-data.ts';
import { WORDS } from '../search/synthetic-pages.ts';
import { chance } from '../support/chance.ts';
import { sitePages } from '../support/site-files.ts';

/** A folder with the find page and all that it loads. */
export interface FindSite {
  readonly folder: string;
  readonly formulas: number;
  /** The code of one of them. */
  readonly code: string;
  /** All that can be found, formulas or not. */
  readonly pages: number;
  /** What the finder loads before it is asked anything. */
  readonly data: string;
  readonly properties: number;
  /** For indexing and reading back. [s] */
  readonly seconds: number;
}

/**
 * The find page of a built site with more formulas: the site's own formula pages are multiplied under other codes and
 * names, so the pages are as long as real ones; the finder's rows are theirs, moved a little. Without a count the
 * site's own formulas, as they are.
 */
export async function manyFormulas(site: string, count: number | null): Promise<FindSite> {
  const folder = mkdtempSync(join(tmpdir(), 'find-'));
  const finder: FinderData = JSON.parse(
    readFileSync(join(site, 'search/finder.js'), 'utf8')
      .replace(/^[^{]*/, '')
      .replace(/;\s*$/, ''),
  );
  const indexed = sitePages(site)
    .map((path) => ({ path, html: readFileSync(join(site, path), 'utf8') }))
    .filter(({ html }) => html.includes('data-pagefind-body'));
  const isFormula = ({ path }: { readonly path: string }) => path.startsWith('formulas/');
  const own = indexed.filter(isFormula);
  const others = indexed.filter((page) => !isFormula(page));
  const { pages, rows } =
    count === null ? { pages: own, rows: finder } : multiplied(own, finder, count);
  const started = performance.now();
  const { files } = await buildSearch(
    [...others, ...pages],
    pages.map(({ path }) => path),
  );
  const seconds = (performance.now() - started) / 1000;
  const data = `self.handbookFinder=${JSON.stringify(rows)};\n`;
  for (const part of ['find.html', 'assets', 'mark.svg']) {
    cpSync(join(site, part), join(folder, part), { recursive: true });
  }
  for (const { path, text } of [...files, { path: 'finder.js', text: data }]) {
    mkdirSync(dirname(join(folder, 'search', path)), { recursive: true });
    writeFileSync(join(folder, 'search', path), text);
  }
  return {
    folder,
    formulas: rows.codes.length,
    code: rows.codes[17] ?? '',
    pages: pages.length + others.length,
    data,
    properties: rows.properties.length,
    seconds,
  };
}

function multiplied(
  own: readonly { readonly html: string }[],
  finder: FinderData,
  count: number,
): {
  readonly pages: readonly { readonly path: string; readonly html: string }[];
  readonly rows: FinderData;
} {
  const random = chance(12);
  const rows = Array.from({ length: count }, (_, i) => {
    const from = i % own.length;
    const name = `${random.pick(WORDS)} ${random.pick(WORDS)}`.replace(/[<&]/g, '');
    return { from, name, code: `QY-${String(i).padStart(5, '0')}` };
  });
  return {
    pages: rows.map(({ from, name, code }) => ({
      path: `formulas/${code}.html`,
      html: (own[from]?.html ?? '')
        .replaceAll(finder.codes[from] ?? '', code)
        .replaceAll(finder.names[from] ?? '', name),
    })),
    rows: {
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
    },
  };
}
