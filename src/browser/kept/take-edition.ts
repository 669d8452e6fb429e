import { EDITION_FILE, LIST_FILE, readSiteEdition, type SiteEdition } from './copy.ts';
import { fetchFile, sha256 } from './fetch-file.ts';
import { isKeptAtOnce, readFileList } from './file-list.ts';
import { type HeldCopy, hold, openCopy } from './storage.ts';

/** As many as browsers open to one host anyway. */
const AT_ONCE = 6;
/** A bench does not wait longer to learn whether the site answers. [ms] */
const PATIENCE = 8000;

/** What the site says of itself now, past every cache; `null` where it cannot be reached. */
export async function siteEdition(scope: string): Promise<SiteEdition | null> {
  return readSiteEdition((await freshText(scope + EDITION_FILE)) ?? '');
}

/**
 * Takes the edition that the site has now as a whole. Files that did not change come from the copy before. Until the
 * last one is there the copy before goes on answering; what was fetched stays for the next try.
 *
 * @param today The day by the clock of the device, `2026-12-01`.
 * @throws Error where a file cannot be had or is of another edition than the rest.
 */
export async function takeEdition(
  scope: string,
  before: HeldCopy | null,
  today: string,
): Promise<void> {
  const edition = await siteEdition(scope);
  const list = await freshText(scope + LIST_FILE);
  if (!list || !edition) throw new Error('the site cannot be reached');
  // the site names the digest of its list, so that the two are of one edition
  const others = list.replace(/^.* kept-copy\.json\n/m, '');
  if ((await sha256(new TextEncoder().encode(others))) !== edition.content) {
    throw new Error('the site is being changed');
  }
  const files = readFileList(list);
  const cache = await openCopy(scope, edition.content);
  const wanted = [...files].filter(([path]) => isKeptAtOnce(path));
  const next = wanted.values();
  const lane = async () => {
    for (const [path, hash] of next) {
      await bring(scope, cache, before, path, hash);
    }
  };
  await Promise.all(Array.from({ length: AT_ONCE }, lane));
  await cache.put(scope + LIST_FILE, textFile(list));
  await hold(scope, { edition, keptOn: today });
}

async function bring(
  scope: string,
  cache: Cache,
  before: HeldCopy | null,
  path: string,
  hash: string,
): Promise<void> {
  // what is there was held against this hash when it came: the name of the cache is that of its list
  if (await cache.match(scope + path)) return;
  const same =
    before?.files.get(path) === hash ? await before.cache.match(scope + path) : undefined;
  if (same) {
    await cache.put(scope + path, same);
    return;
  }
  const fetched = await fetchFile(scope + path, hash);
  if (!fetched.ok) throw new Error(`${path}: ${fetched.why}`);
  await cache.put(scope + path, fetched.response);
}

async function freshText(address: string): Promise<string | null> {
  try {
    const signal = AbortSignal.timeout(PATIENCE);
    const answer = await fetch(address, { cache: 'no-store', signal });
    return answer.ok ? await answer.text() : null;
  } catch {
    return null;
  }
}

const textFile = (text: string) =>
  new Response(text, { headers: { 'content-type': 'text/plain; charset=utf-8' } });
