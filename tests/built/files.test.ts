import { existsSync, readFileSync } from 'node:fs';
import { dirname, join, posix } from 'node:path';
import { describe, expect, inject, test } from 'vitest';
import { siteFiles, sitePages } from '../support/site-files.ts';

const site = inject('site');
const read = (path: string) => readFileSync(join(site, path), 'utf8');

const known = new Map<string, ReadonlySet<string>>();
function idsOf(path: string): ReadonlySet<string> {
  const ids =
    known.get(path) ?? new Set([...read(path).matchAll(/ id="([^"]*)"/g)].map(([, id = '']) => id));
  known.set(path, ids);
  return ids;
}

describe('every page', () => {
  const pages = sitePages(site);

  test.each(pages)('%s carries the strict policy and nothing that it forbids', (path) => {
    const html = read(path);
    const policy =
      html.match(/http-equiv="Content-Security-Policy"\s+content="([^"]*)"/i)?.[1] ?? '';
    expect(policy).toContain("default-src 'none'");
    expect(policy).not.toMatch(/unsafe|wasm|https?:|\*/);
    expect(html).not.toMatch(/<style|\sstyle=|\son[a-z]+="|<script(?![^>]*\ssrc=)|javascript:/i);
    expect(html).toMatch(/<html[^>]*\slang="[a-z]/);
    expect(html).toMatch(/<html[^>]*\sdata-root="/);
    expect(html).toMatch(/<title>[^<]+<\/title>/);
  });

  test.each(pages)('%s links to files that are there, and to places in them', (path) => {
    const html = read(path);
    for (const [, raw = ''] of html.matchAll(/\s(?:href|src)="([^"]*)"/g)) {
      const link = raw.replaceAll('&amp;', '&');
      if (/^(https:|mailto:)/.test(link)) continue;
      expect(link, `${path} has an address that is not relative`).not.toMatch(/^([a-z]+:|\/)/i);
      const [file = '', anchor] = link.split('#');
      const target = file === '' ? path : posix.normalize(posix.join(dirname(path), file));
      expect(existsSync(join(site, decodeURIComponent(target))), `${path} -> ${link}`).toBe(true);
      // with a `=` it asks the finder something
      if (anchor && !anchor.includes('=') && target.endsWith('.html')) {
        expect(idsOf(target).has(anchor), `${path} -> ${link}`).toBe(true);
      }
    }
  });
});

test('no file of the site holds WebAssembly', () => {
  const magic = Buffer.from([0x00, 0x61, 0x73, 0x6d]);
  const found = siteFiles(site).filter((path) => {
    const bytes = readFileSync(join(site, path));
    return bytes.includes(magic) || /\.wasm$|pagefind\.js$/.test(path);
  });
  expect(found).toEqual([]);
});
