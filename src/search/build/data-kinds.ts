/** A file of the index as Pagefind hands it over. */
export interface IndexFile {
  readonly path: string;
  readonly content: Uint8Array;
}

const DATA = [
  /^pagefind-entry\.json$/,
  /^pagefind\.[^/]+\.pf_meta$/,
  /^index\/[^/]+\.pf_index$/,
  /^filter\/[^/]+\.pf_filter$/,
  /^fragment\/[^/]+\.pf_fragment$/,
];

// the stock client and its program; they run on WebAssembly, or draw pages that are not ours
const LEFT_OUT = [/^wasm\.[^/]+\.pagefind$/, /^pagefind(-[a-z-]+)?\.(js|css)$/];

/** The files that hold data. Throws where a kind is unknown: it could be data that readers need, or a program. */
export function dataFiles(files: readonly IndexFile[]): readonly IndexFile[] {
  const matches = (patterns: readonly RegExp[], { path }: IndexFile) =>
    patterns.some((pattern) => pattern.test(path));
  const unknown = files.filter((file) => !matches([...DATA, ...LEFT_OUT], file));
  if (unknown.length > 0) {
    throw new Error(
      `The search index has files of an unknown kind: ${unknown.map(({ path }) => path).join(', ')}`,
    );
  }
  return files.filter((file) => matches(DATA, file)).toSorted((a, b) => (a.path < b.path ? -1 : 1));
}
