import { bytesFromBase64, inflatePayload } from '../reader/payload.ts';
import type { SearchEntry } from '../reader/search.ts';
import { stemmerFor } from '../reader/stemmer.ts';
import { chunkScript } from './chunk-scripts.ts';
import { dataFiles } from './data-kinds.ts';
import { indexPages, type Page } from './index-pages.ts';
import { languagesOf } from './languages.ts';
import { readWholeIndex } from './read-back.ts';
import { stemExceptions } from './stem-exceptions.ts';

/** A script to write below the folder of the search data. */
export interface ChunkFile {
  readonly path: string;
  readonly text: string;
}

export interface BuiltSearch {
  readonly files: readonly ChunkFile[];
  readonly entries: readonly SearchEntry[];
  /** Paths of the pages that can be found. */
  readonly found: readonly string[];
}

/**
 * The search data of the pages, as classic scripts. All of it has been read back with the reader that the browser
 * uses; throws where that fails, or where it finds pages that were not given. `rows` are paths of pages that must be
 * found by their place in this list.
 */
export async function buildSearch(
  pages: readonly Page[],
  rows: readonly string[] = [],
): Promise<BuiltSearch> {
  const index = dataFiles(await indexPages(pages));
  const carried = new Map(
    index.map(({ path, content }) => [path, Buffer.from(content).toString('base64')]),
  );
  const chunk = (name: string) => {
    const found = carried.get(name);
    if (found === undefined) throw new Error(`The search index lacks ${name}.`);
    return found;
  };
  const load = async (name: string) => inflatePayload(bytesFromBase64(chunk(name)));
  const files: ChunkFile[] = [];
  const entries: SearchEntry[] = [];
  const found: string[] = [];
  for (const bare of languagesOf(index)) {
    const { urls, texts, words } = await readWholeIndex(bare, load);
    const exceptions = stemExceptions(texts, words, stemmerFor(bare.language, {}));
    const numbers = new Map(urls.map((url, page) => [url, page]));
    const entry = {
      ...bare,
      stemExceptions: exceptions,
      rows: rows.map((path) => numbers.get(path) ?? missing(path)),
    };
    const name = `entry.${entry.language}`;
    files.push({
      path: `${name}.js`,
      text: chunkScript({
        [name]: JSON.stringify(entry),
        [entry.contents]: chunk(entry.contents),
      }),
    });
    entries.push(entry);
    found.push(...urls);
  }
  const given = new Set(pages.map(({ path }) => path));
  const strange = found.filter((url) => !given.has(url));
  if (strange.length > 0)
    throw new Error(`The search index names pages that are not there: ${strange}`);
  const rest = [...carried.keys()].filter((name) => !/\.(json|pf_meta)$/.test(name));
  files.push(
    ...rest.map((name) => ({ path: `${name}.js`, text: chunkScript({ [name]: chunk(name) }) })),
  );
  return { files, entries, found };
}

function missing(path: string): never {
  throw new Error(`The search index lacks the page ${path}.`);
}
