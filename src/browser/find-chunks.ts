import { bytesFromBase64, inflatePayload } from '../search/reader/payload.ts';
import { openSearch, type Search, type SearchEntry } from '../search/reader/search.ts';

declare global {
  /** Filled by the chunk scripts, by name. */
  var handbookIndex: Record<string, string> | undefined;
}

/** A file of the search data that is missing or damaged; its message is the file's path. */
export class ChunkError extends Error {}

/** Whether this browser can unpack the files of the search. */
export const canSearch = (): boolean => 'DecompressionStream' in globalThis;

/** Path from this page to the root of the handbook. */
const root = document.documentElement.dataset.root ?? '';

/** The address of a page of the handbook, from here. */
export const addressOf = (path: string): string => root + path;

/** Opens the search of a language. Rejects with a `ChunkError`. */
export async function openHandbookSearch(
  language: string,
): Promise<{ readonly search: Search; readonly entry: SearchEntry }> {
  const name = `entry.${language}`;
  const text = await carried(name, name);
  const entry = entryFrom(text, name);
  const search = await openSearch(entry, (chunk) =>
    payload(chunk, chunk === entry.contents ? name : chunk),
  );
  return { search, entry };
}

function entryFrom(text: string, name: string): SearchEntry {
  try {
    return JSON.parse(text);
  } catch {
    throw new ChunkError(pathOf(name));
  }
}

async function payload(chunk: string, script: string): Promise<Uint8Array> {
  const text = await carried(chunk, script);
  try {
    return await inflatePayload(bytesFromBase64(text));
  } catch {
    throw new ChunkError(pathOf(script));
  }
}

/** What a chunk script carries under a name. It is a script element because nothing can be fetched from a disk. */
async function carried(chunk: string, script: string): Promise<string> {
  if (globalThis.handbookIndex?.[chunk] === undefined) await runScript(pathOf(script));
  const text = globalThis.handbookIndex?.[chunk];
  if (text === undefined) throw new ChunkError(pathOf(script));
  delete globalThis.handbookIndex?.[chunk];
  return text;
}

const pathOf = (script: string) => `search/${script}.js`;

function runScript(path: string): Promise<void> {
  return new Promise((resolve, reject) => {
    const script = document.createElement('script');
    script.src = addressOf(path);
    script.onload = () => {
      script.remove();
      resolve();
    };
    script.onerror = () => {
      script.remove();
      reject(new ChunkError(path));
    };
    document.head.append(script);
  });
}
