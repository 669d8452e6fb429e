import { type KeptCopy, LIST_FILE } from './copy.ts';
import { readFileList } from './file-list.ts';

/** A copy with the names of its files, ready to answer from. */
export interface HeldCopy extends KeptCopy {
  readonly files: ReadonlyMap<string, string>;
  readonly cache: Cache;
}

/** Two handbooks on one host keep apart by their scope. */
const mainName = (scope: string) => `kept-copy ${scope} `;
const cacheName = (scope: string, content: string) => mainName(scope) + content;

/** Where the files of an edition are gathered; it counts for nothing until `hold` names it. */
export const openCopy = (scope: string, content: string): Promise<Cache> =>
  caches.open(cacheName(scope, content));

/** The copy that this device holds; `null` where there is none. */
export async function heldCopy(scope: string): Promise<HeldCopy | null> {
  const main = await caches.open(mainName(scope));
  const record = await main.match(scope);
  if (!record) return null;
  const copy = (await record.json()) as KeptCopy;
  const cache = await openCopy(scope, copy.edition.content);
  const list = await cache.match(scope + LIST_FILE);
  return list ? { ...copy, cache, files: readFileList(await list.text()) } : null;
}

/** Makes a whole copy the one that answers, in one step, then lets the others go. */
export async function hold(scope: string, copy: KeptCopy): Promise<void> {
  const main = await caches.open(mainName(scope));
  await main.put(scope, new Response(JSON.stringify(copy)));
  const kept = [mainName(scope), cacheName(scope, copy.edition.content)];
  for (const name of await caches.keys()) {
    if (name.startsWith(mainName(scope)) && !kept.includes(name)) await caches.delete(name);
  }
}
