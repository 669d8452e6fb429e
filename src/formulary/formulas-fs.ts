import { readdirSync } from 'node:fs';
import { dirname, join, relative } from 'node:path';
import { LARGEST_FILE, type ReadText, readText } from '../reference/read-text-fs.ts';
import type { FormulaRule } from '../words/en/problems-formula.ts';
import type { Problem } from '../words/problem.ts';
import { checkAcross } from './checks/across.ts';
import type { Formula } from './formula.ts';
import type { Known } from './known.ts';
import { type FormulaRead, readFormula } from './read-formula.ts';
import { formulaProblem, type ProblemParts } from './report.ts';

export interface FormulasRead {
  readonly formulas: readonly Formula[];
  readonly problems: readonly Problem[];
  /** All codes as written with their files, also of formulas that are not sound. */
  readonly codes: readonly { readonly text: string; readonly file: string }[];
}

/**
 * Reads every Markdown file directly in `folder` and holds the files against each other. Problems name the
 * files by `folder` and name, so give `folder` as its user would type it. `known` null: the data cannot be
 * read, and ids are not looked up. Never throws for bad input.
 */
export function readFormulas(folder: string, known: Known | null): FormulasRead {
  const names = listFolder(folder);
  if (names === null) return refusedFolder(folder, 'formulary/missing-folder', 'no such folder');
  const formulaNames = names.filter((name) => /\.md$/i.test(name));
  if (formulaNames.length === 0) {
    return refusedFolder(folder, 'formulary/empty', 'a folder without formula files');
  }
  const images = new Set(names.filter(isImage));
  const reads = formulaNames.map((name) => {
    const file = `${folder.replace(/[/\\]+$/, '')}/${name}`;
    const read = name.includes('/')
      ? refused(file, 'formulary/nested-file', NESTED)
      : readOne(join(folder, name), file, known, images);
    return { file, read };
  });
  return {
    formulas: reads.flatMap(({ read }) => read.formula ?? []),
    problems: [...reads.flatMap(({ read }) => read.problems), ...checkAcross(reads)],
    codes: reads.flatMap(({ read, file }) => (read.code ? { text: read.code.text, file } : [])),
  };
}

/** One formula file by its path, wherever it lies; pictures are looked for beside it. */
export const readFormulaFile = (file: string, known: Known | null): FormulaRead =>
  readOne(file, file.replaceAll('\\', '/'), known, imagesIn(dirname(file)));

/** The picture files of a folder of formulas, as a formula may name them. */
export const imagesIn = (folder: string): ReadonlySet<string> =>
  new Set((listFolder(folder) ?? []).filter(isImage));

const isImage = (name: string) => /\.(png|jpe?g|webp)$/i.test(name);

/** Names below `folder` with forward slashes, sorted by code point; `null` where it cannot be listed. */
function listFolder(folder: string): readonly string[] | null {
  try {
    return readdirSync(folder, { recursive: true, withFileTypes: true })
      .filter((entry) => !entry.isDirectory())
      .map((entry) => relative(folder, join(entry.parentPath, entry.name)).replaceAll('\\', '/'))
      .filter((name) => !/(^|\/)(\.|node_modules\/)/.test(name))
      .sort((a, b) => (a < b ? -1 : 1));
  } catch {
    return null;
  }
}

function refusedFolder(folder: string, rule: FormulaRule, found: string): FormulasRead {
  const { problems } = refused(folder, rule, {
    found,
    expected: 'a folder with one Markdown file for each formula',
    advice: 'name the folder with --formulas, or begin with npm run new',
  });
  return { formulas: [], problems, codes: [] };
}

function refused(
  file: string,
  rule: FormulaRule,
  { line = 1, ...parts }: ProblemParts & { readonly line?: number },
): FormulaRead {
  const problems = [formulaProblem(file, { line, column: 1 }, rule, parts)];
  return { formula: null, problems, code: null, links: [] };
}

const NESTED: ProblemParts = {
  found: 'a Markdown file in a folder inside',
  expected: 'formula files directly in the folder of formulas; folders inside are for pictures',
  advice: 'move it up',
};

function readOne(
  path: string,
  file: string,
  known: Known | null,
  images: ReadonlySet<string>,
): FormulaRead {
  const read: ReadText = readText(path);
  if (read.ok) return readFormula(read.text, file, known, images);
  if (read.why === 'too-large') {
    return refused(file, 'formula/too-large', {
      found: `a file of ${read.bytes} bytes`,
      expected: `at most ${LARGEST_FILE}`,
      advice: 'a formula is a page of text; keep pictures in files of their own',
    });
  }
  if (read.why === 'not-utf8') {
    return refused(file, 'formula/not-utf8', {
      line: read.line,
      found: 'bytes that are not UTF-8 text',
      expected: 'a text file in UTF-8',
      advice: 'save it again with the encoding UTF-8',
    });
  }
  return refused(file, 'formula/unreadable', {
    found: 'a file that cannot be opened',
    expected: 'one that may be read',
    advice: 'look at its permissions',
  });
}
