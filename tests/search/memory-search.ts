import type { IndexFile } from '../../src/search/build/data-kinds.ts';
import { languagesOf } from '../../src/search/build/languages.ts';
import { readWholeIndex } from '../../src/search/build/read-back.ts';
import { stemExceptions } from '../../src/search/build/stem-exceptions.ts';
import { inflatePayload } from '../../src/search/reader/payload.ts';
import { openSearch, type SearchOptions } from '../../src/search/reader/search.ts';
import { stemmerFor } from '../../src/search/reader/stemmer.ts';

/** Our reader over the files of an index of one language, without any browser or disk. */
export async function memorySearch(files: readonly IndexFile[], options: SearchOptions = {}) {
  const load = async (name: string) => {
    const file = files.find(({ path }) => path === name);
    if (!file) throw new Error(`no ${name}`);
    return inflatePayload(Uint8Array.from(file.content));
  };
  const [bare] = languagesOf(files);
  if (!bare) throw new Error('no language');
  const { texts, words, urls } = await readWholeIndex(bare, load);
  const exceptions = stemExceptions(texts, words, stemmerFor(bare.language, {}));
  const entry = { ...bare, stemExceptions: exceptions };
  return { search: await openSearch(entry, load, options), entry, texts, urls, words };
}
