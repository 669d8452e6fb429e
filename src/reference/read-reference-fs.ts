import { type Dirent, readdirSync } from 'node:fs';
import type { Problem } from '../words/problem.ts';
import { DATA_FOLDERS, type DataFile, dataFileAdvice, SHOP_FILES } from './data-files.ts';
import { LARGEST_FILE, readText } from './read-text-fs.ts';
import { type ReadReference, referenceFrom } from './reference-from.ts';
import { dataProblem } from './report.ts';

const START = { line: 1, column: 1 };

/**
 * Reads the data folders, which lie over one another: a file of a later folder replaces the one of the same
 * name; `shop.yaml`, `lots.yaml`, `blends.yaml`, `prices.yaml` and `own-sources.yaml` count in the last folder only.
 * Never throws for what stands in the files. `reference` is `null` where there is any error. `locale` as `referenceFrom`.
 */
export function readReference(
  folders: readonly string[],
  locale: string | null = null,
): ReadReference {
  const problems: Problem[] = [];
  const files = new Map<string, DataFile>();
  const last = folders.at(-1) ?? 'data';
  for (const folder of new Set(folders)) {
    for (const name of namesIn(folder, problems)) {
      if (SHOP_FILES.includes(name) && folder !== last) continue;
      const file = `${folder.replace(/[/\\]+$/, '')}/${name}`;
      const advice = dataFileAdvice(name);
      if (advice !== null) {
        problems.push(
          dataProblem(file, START, 'data/unknown-file', {
            found: `the file "${name}"`,
            expected: 'only data files in the data folder',
            advice,
          }),
        );
        continue;
      }
      const text = textOf(file, problems);
      if (text !== null) files.set(name, { name, file, text, packaged: folder === folders[0] });
    }
  }
  if (problems.length > 0) {
    // what is missing only because it could not be read is not reported a second time
    const rest = referenceFrom([...files.values()], last, locale).problems.filter(
      ({ rule }) => rule !== 'data/missing-file',
    );
    return { reference: null, problems: [...problems, ...rest] };
  }
  return referenceFrom([...files.values()], last, locale);
}

/** YAML files of a data folder and its known sub-folders, by code point. */
function namesIn(folder: string, problems: Problem[]): string[] {
  const entries = list(folder);
  if (entries === null) {
    problems.push(
      dataProblem(folder, START, 'data/missing-folder', {
        found: 'no such folder',
        expected: 'a folder of data files',
        advice: 'check the path',
      }),
    );
    return [];
  }
  const inner = DATA_FOLDERS.flatMap((sub) =>
    (list(`${folder}/${sub}`) ?? []).map((entry) => ({ entry, name: `${sub}/${entry.name}` })),
  );
  return [...entries.map((entry) => ({ entry, name: entry.name })), ...inner]
    .filter(({ entry, name }) => !entry.isDirectory() && /\.ya?ml$/i.test(name))
    .map(({ name }) => name)
    .sort((a, b) => (a < b ? -1 : a > b ? 1 : 0));
}

function list(folder: string): Dirent[] | null {
  try {
    return readdirSync(folder, { withFileTypes: true });
  } catch {
    return null;
  }
}

function textOf(file: string, problems: Problem[]): string | null {
  const read = readText(file);
  if (read.ok) return read.text;
  switch (read.why) {
    case 'too-large':
      problems.push(
        dataProblem(file, START, 'data/too-large', {
          found: `${read.bytes} bytes`,
          expected: `at most ${LARGEST_FILE} bytes`,
          advice: 'a data file holds one material; split it or remove what does not belong',
        }),
      );
      return null;
    case 'not-utf8':
      problems.push(
        dataProblem(file, { line: read.line, column: 1 }, 'data/not-utf8', {
          found: 'bytes that are not UTF-8',
          expected: 'UTF-8 text',
          advice: 'save the file as UTF-8 in your editor',
        }),
      );
      return null;
    default:
      problems.push(
        dataProblem(file, START, 'data/unreadable', {
          found: 'a file that cannot be opened',
          expected: 'a readable file',
          advice: 'check that it exists and that you may read it',
        }),
      );
      return null;
  }
}
