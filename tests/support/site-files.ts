import { readdirSync } from 'node:fs';
import { sep } from 'node:path';

/** All files of a built site by their relative path with forward slashes, sorted. */
export const siteFiles = (site: string): readonly string[] =>
  readdirSync(site, { recursive: true, withFileTypes: true })
    .filter((entry) => entry.isFile())
    .map((entry) =>
      `${entry.parentPath}${sep}${entry.name}`.slice(site.length + 1).replaceAll(sep, '/'),
    )
    .sort();

export const sitePages = (site: string) => siteFiles(site).filter((path) => path.endsWith('.html'));
