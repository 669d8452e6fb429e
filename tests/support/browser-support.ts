import bcd from '@mdn/browser-compat-data' with { type: 'json' };
import type { CompatStatement, SimpleSupportStatement } from '@mdn/browser-compat-data';

/** The oldest browsers that the handbook is for, as DEVELOPERS.md lists them. */
export const OLDEST = {
  chrome: '111',
  chrome_android: '111',
  edge: '111',
  firefox: '115',
  firefox_android: '115',
  safari: '16.4',
  safari_ios: '16.4',
} as const;

/** A feature of the compatibility data by the way to it: `css.properties.text-wrap.balance`. */
type Tree = { readonly __compat?: CompatStatement } & { readonly [name: string]: unknown };

/** Whether the data know the feature. */
export const isKnown = (path: readonly string[]): boolean => node(path)?.__compat !== undefined;

/** Those of the oldest browsers that lack a feature. None where the data do not know it. */
export function lacking(path: readonly string[]): readonly string[] {
  const support = node(path)?.__compat?.support;
  if (!support) return [];
  return Object.entries(OLDEST)
    .filter(([browser, oldest]) => {
      const statements = [support[browser as keyof typeof OLDEST] ?? []].flat();
      return !statements.some((statement) => isThere(statement, oldest));
    })
    .map(([browser]) => browser);
}

/** The names below a feature. */
export const namesBelow = (path: readonly string[]): readonly string[] =>
  Object.keys(node(path) ?? {}).filter((name) => name !== '__compat');

function node(path: readonly string[]): Tree | undefined {
  let found: unknown = bcd;
  for (const name of path) {
    if (typeof found !== 'object' || found === null || !Object.hasOwn(found, name))
      return undefined;
    found = (found as Tree)[name];
  }
  return found as Tree;
}

function isThere(statement: SimpleSupportStatement, oldest: string): boolean {
  const { version_added: added, version_removed: removed, flags, prefix } = statement;
  if (flags || prefix || typeof added !== 'string' || added === 'preview') return false;
  // a statement ends where the next begins, such as when a part that was missing came
  const gone = typeof removed === 'string' && order(removed) <= order(oldest);
  return !gone && order(added.replace('≤', '')) <= order(oldest);
}

/** `16.4` as a number that versions can be ordered by. */
function order(version: string): number {
  const [major = '0', minor = '0'] = version.split('.');
  return Number(major) * 1000 + Number(minor);
}
