import { hiddenCharacters } from '../words/hidden-characters.ts';
import type { Place } from './yaml.ts';

/** Where a file has characters that cannot be seen. A byte order mark at its very beginning is none. */
export function hiddenPlaces(
  fileText: string,
): readonly { readonly place: Place; readonly name: string }[] {
  const text = fileText.replace(/^\uFEFF/, '');
  if (hiddenCharacters(text).length === 0) return [];
  return text.split(/\r?\n/).flatMap((line, index) =>
    hiddenCharacters(line).map(({ index: column, name }) => ({
      place: { line: index + 1, column: column + 1 },
      name,
    })),
  );
}
