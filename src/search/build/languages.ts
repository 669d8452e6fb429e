import type { SearchEntry } from '../reader/search.ts';
import type { IndexFile } from './data-kinds.ts';

/** What a reader starts from, for each language of an index; stem exceptions and rows are not known yet. */
export function languagesOf(index: readonly IndexFile[]): readonly SearchEntry[] {
  const file = index.find(({ path }) => path === 'pagefind-entry.json');
  if (!file) throw new Error('The search index lacks its list of languages.');
  const list: unknown = JSON.parse(new TextDecoder().decode(file.content));
  if (!isLanguageList(list))
    throw new Error('The search index has a list of languages of another form.');
  return Object.entries(list.languages).map(([language, { hash }]) => ({
    language,
    contents: `pagefind.${hash}.pf_meta`,
    includeCharacters: list.include_characters,
    stemExceptions: {},
    rows: [],
  }));
}

interface LanguageList {
  readonly languages: Readonly<Record<string, { readonly hash: string }>>;
  readonly include_characters: readonly string[];
}

const isLanguageList = (value: unknown): value is LanguageList =>
  typeof value === 'object' &&
  value !== null &&
  'languages' in value &&
  'include_characters' in value &&
  Array.isArray(value.include_characters);
