import { posix } from 'node:path';

/** A page with its links made relative, and the links that lead nowhere. */
export interface RewrittenLinks {
  readonly rewritten: string;
  readonly missing: readonly string[];
}

/**
 * Rewrites every site-absolute `href`, `src`, `srcset`, `data-root` and CSS `url()` of one file.
 *
 * `files` are all files of the site, with `/` and without a leading one; `idsOn` gives the ids of one of them, in which
 * anchors are looked up. Links within a page (`#weights`) are checked too. Other hosts are left alone.
 */
export function rewriteLinks(
  file: string,
  text: string,
  files: ReadonlySet<string>,
  idsOn: (page: string) => ReadonlySet<string>,
): RewrittenLinks {
  const missing: string[] = [];
  const from = posix.dirname(file);
  const targets = new Map<string, ReadonlySet<string>>();
  const has = (page: string, id: string) => {
    const ids = targets.get(page) ?? idsOn(page);
    targets.set(page, ids);
    return ids.has(id);
  };
  const relativeTo = (link: string) => {
    const [path = '', anchor] = link.split('#');
    const target = path === '' ? file : path.slice(1);
    if (!files.has(target)) missing.push(link);
    // with a `=` it asks the finder something
    else if (anchor && !anchor.includes('=') && !has(target, anchor)) {
      missing.push(link);
    }
    const hash = anchor === undefined ? '' : `#${anchor}`;
    return path === '' ? hash : posix.relative(from, target) + hash;
  };
  const rewritten = text
    .replace(/(\s(?:href|src)=")([/#][^"]*)"/g, (whole, start: string, link: string) =>
      link.startsWith('//') || link === '#' ? whole : `${start}${relativeTo(link)}"`,
    )
    .replace(/(\ssrcset=")([^"]*)"/g, (_, start: string, set: string) => {
      const parts = set.split(/,\s+/).map((part) => part.replace(/^\/\S+/, relativeTo));
      return `${start}${parts.join(', ')}"`;
    })
    .replace(
      /(\sdata-root=")\/"/g,
      (_, start: string) => `${start}${posix.relative(from, '.') || '.'}/"`,
    )
    .replace(/url\((\/[^)]*)\)/g, (_, link: string) => `url(${relativeTo(link)})`);
  return { rewritten, missing };
}

/** The ids of a page, which links lead to. */
export const idsOf = (html: string): ReadonlySet<string> =>
  new Set([...html.matchAll(/ id="([^"]*)"/g)].map(([, id]) => id ?? ''));
