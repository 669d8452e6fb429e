import { posix } from 'node:path';

/** A page with its links made relative, and the links that lead nowhere. */
export interface RewrittenLinks {
  readonly rewritten: string;
  readonly missing: readonly string[];
}

/**
 * Rewrites every site-absolute `href`, `src`, `srcset`, `data-root` and CSS `url()` of one file.
 *
 * `files` are all files of the site, with `/` and without a leading one; `texts` holds the pages, in which
 * anchors are looked up. Links within a page (`#weights`) are checked too. Other hosts are left alone.
 */
export function rewriteLinks(
  file: string,
  text: string,
  files: ReadonlySet<string>,
  texts: ReadonlyMap<string, string>,
): RewrittenLinks {
  const missing: string[] = [];
  const from = posix.dirname(file);
  const relativeTo = (link: string) => {
    const [path = '', anchor] = link.split('#');
    const target = path === '' ? file : path.slice(1);
    if (!files.has(target)) missing.push(link);
    // with a `=` it asks the finder something
    else if (anchor && !anchor.includes('=') && !hasAnchor(texts, target, anchor)) {
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

const known = new WeakMap<ReadonlyMap<string, string>, Map<string, ReadonlySet<string>>>();

/** Whether a page has an id. The ids of a page are looked for once, as hundreds of links lead into some. */
function hasAnchor(texts: ReadonlyMap<string, string>, page: string, anchor: string): boolean {
  const pages = known.get(texts) ?? new Map<string, ReadonlySet<string>>();
  known.set(texts, pages);
  const ids = pages.get(page) ?? idsOf(texts.get(page) ?? '');
  pages.set(page, ids);
  return ids.has(anchor);
}

const idsOf = (html: string) =>
  new Set([...html.matchAll(/ id="([^"]*)"/g)].map(([, id]) => id ?? ''));
