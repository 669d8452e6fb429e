import { whatIsWrongWith } from '../../reference/ids.ts';
import { openFile } from '../../reference/open-file.ts';
import { readText } from '../../reference/read-text-fs.ts';
import { readAddress } from '../../search/finder/address.ts';
import type { FinderData } from '../../search/finder/finder-data.ts';
import { type SavedSearch, savedSearchesSchema } from '../../search/saved/saved-search.ts';
import type { Problem } from '../../words/problem.ts';

const NAME = 'searches.yaml';

/**
 * The shop's kept searches, from `searches.yaml` of its data folder; none where there is no such file. A part of a
 * search that the finder does not know is a problem, as are words and where to look for them, which no page can answer for when it is made.
 */
export function readSavedSearches(
  folder: string,
  data: FinderData,
): { readonly searches: readonly SavedSearch[]; readonly problems: readonly Problem[] } {
  const file = `${folder.replace(/[/\\]+$/, '')}/${NAME}`;
  const read = readText(file);
  // a file that is there and cannot be read has been reported with the rest of the data
  if (!read.ok) return { searches: [], problems: [] };
  const problems: Problem[] = [];
  const opened = openFile(
    { name: NAME, file, text: read.text, packaged: false },
    savedSearchesSchema,
    problems,
  );
  if (!opened) return { searches: [], problems };
  const ids = new Set<string>();
  for (const [i, { id, search }] of opened.value.searches.entries()) {
    if (ids.has(id)) {
      opened.report.in(['searches', i, 'id'], 'data/repeated-entry', {
        found: `"${id}" a second time`,
        expected: 'each id once',
        advice: 'give one of the two another id',
      });
    }
    ids.add(id);
    const expected = whatIsWrongWith(id);
    if (expected !== null) {
      opened.report.in(['searches', i, 'id'], 'data/text-form', {
        found: `the id "${id}"`,
        expected,
        advice: 'the title may be anything',
      });
    }
    const { state, ignored } = readAddress(search, data);
    const unknown = [
      ...ignored,
      ...(state.words === '' ? [] : [`words=${state.words}`]),
      ...(state.where ? [`where=${state.where}`] : []),
    ];
    for (const part of unknown) {
      opened.report.in(['searches', i, 'search'], 'data/text-form', {
        found: `"${part}"`,
        expected: 'limits as they stand in the address of the finder, without words',
        advice: 'make the search on the find page and copy what stands after the "#"',
      });
    }
  }
  return {
    searches: opened.value.searches.map((each) => ({ ...each, note: each.note ?? null })),
    problems,
  };
}
