import { readdirSync, rmSync } from 'node:fs';
import { isAbsolute, relative, resolve } from 'node:path';
import { fileURLToPath } from 'node:url';
import { build } from 'astro';
import { APPROVAL_RULES } from '../edition/approval.ts';
import { type FolderLock, lockFolder, lostHold } from '../edition/lock-fs.ts';
import { sealEdition } from '../edition/seal-fs.ts';
import {
  dropPrevious,
  healSwap,
  mayBeReplaced,
  moveFolder,
  type SwapFolders,
  swap,
  swapFolders,
} from '../edition/swap-fs.ts';
import { writeProblem } from '../edition/write-problem.ts';
import { isCalendarDate } from '../formulary/calendar-date.ts';
import { measureStage, onStage } from '../formulary/stages.ts';
import { EDITION_MARK } from '../site/common-input.ts';
import { handOver } from '../site/input.ts';
import { counted, problemSummary, problemText } from '../words/problem-text.ts';
import { FOLDERS, readArguments } from './arguments.ts';
import { asOfFor } from './as-of.ts';
import { loadSite } from './load-site.ts';
import { speakFor } from './speak-for.ts';
import { workFolder } from './work-folder.ts';

// the build must not tell anybody that it ran
process.env.ASTRO_TELEMETRY_DISABLED = '1';
// what is published never has what only the preview may have: these would reach the pages from the shell
process.env.NODE_ENV = 'production';
for (const name of ['DEV', 'PROD', 'MODE', 'SSR']) delete process.env[name];

const PROJECT = fileURLToPath(new URL('../..', import.meta.url));

/**
 * Builds the handbook. Everything is loaded and checked before anything is written; the pages are written
 * beside the published folder, which is replaced only when they are whole. Status 1 where it failed; the
 * published folder then is as it was.
 */
export async function main(args: readonly string[]): Promise<number> {
  const read = readArguments(args, {
    command: 'build',
    about: 'Builds the handbook from the formulas and the data.',
    options: {
      ...FOLDERS,
      out: { value: 'DIR', about: 'folder to write (dist)' },
      'as-of': { value: 'DATE', about: 'the date the edition is of (today)' },
      last: { value: 'DIR', about: 'the edition before, for the page of changes' },
      drafts: { value: null, about: 'a proof edition, with what is not approved' },
      'with-costs': {
        value: null,
        about: 'costs on the shopping page and in the finder, by data/prices.yaml',
      },
    },
  });
  if (!read.ok) {
    console.error(read.text);
    return read.status;
  }
  const { formulas = 'formulas', data = 'data', out = 'dist' } = read.given;
  speakFor(data);
  const asOf = asOfFor(read.given['as-of'], data);
  if (!isCalendarDate(asOf)) {
    console.error(`--as-of: "${asOf}" is no date. Write it like 2026-12-01.`);
    return 1;
  }
  const folders = swapFolders(out);
  const inTheWay = [formulas, data, PROJECT].find((folder) => holds(folders.current, folder));
  if (inTheWay !== undefined) {
    console.error(`--out: ${out} holds folders that the build reads. Choose another one.`);
    return 1;
  }
  const taken = lockFolder(out, { makeParent: true });
  if (!taken.ok) {
    for (const problem of taken.problems) console.error(problemText(problem));
    return 1;
  }
  try {
    return await buildInto(folders, taken.lock, { out, formulas, data, asOf, given: read.given });
  } finally {
    taken.lock.release();
  }
}

interface BuildRequest {
  readonly out: string;
  readonly formulas: string;
  readonly data: string;
  readonly asOf: string;
  readonly given: Readonly<Partial<Record<'last' | 'drafts' | 'with-costs', string>>>;
}

/** The build itself, while no other command may write the folder. */
async function buildInto(
  folders: SwapFolders,
  lock: FolderLock,
  { out, formulas, data, asOf, given }: BuildRequest,
): Promise<number> {
  healSwap(folders);
  if (!mayBeReplaced(folders)) {
    console.error(
      `--out: ${out} is not empty and is no handbook, so it is left alone. Choose another folder or empty it.`,
    );
    return 1;
  }

  const start = performance.now();
  onStage((stage, milliseconds) => {
    console.log(`  ${stage.padEnd(9)} ${(milliseconds / 1000).toFixed(1).padStart(6)} s`);
  });
  const loaded = loadSite(
    { formulas, data },
    {
      asOf,
      drafts: given.drafts !== undefined,
      last: given.last ?? null,
      withCosts: given['with-costs'] !== undefined,
    },
  );
  for (const problem of loaded.problems) console.error(problemText(problem));
  if (!loaded.ok) {
    console.error(`${problemSummary(loaded.problems)}. Nothing was built.`);
    if (loaded.problems.some(({ rule }) => APPROVAL_RULES.has(rule))) {
      console.error('To see it all the same: --drafts builds a proof edition, not for use.');
    }
    return 1;
  }
  const count = loaded.input.formulary.formulas.length;
  console.log(`Building ${counted(count, 'formula')} as of ${asOf} ...`);
  handOver(loaded.input, EDITION_MARK);
  const work = workFolder(PROJECT);
  const here = process.cwd();
  try {
    // Astro looks at the folder it runs in to choose where its own output goes
    process.chdir(PROJECT);
    await build({ root: PROJECT, outDir: work, logLevel: 'error', vite: { logLevel: 'error' } });
    const startOfSeal = performance.now();
    sealEdition(work, loaded.input.edition.document);
    measureStage('checksums', startOfSeal);
    if (!lock.isHeld()) throw new Error(problemText(lostHold(out)));
    moveFolder(work, folders.next);
    swap(folders);
    dropPrevious(folders);
  } catch (error) {
    if (lock.isHeld()) healSwap(folders);
    rmSync(work, { recursive: true, force: true });
    console.error(reasonOf(error, out));
    console.error('The build failed. The published folder is as it was.');
    return 1;
  } finally {
    process.chdir(here);
  }
  // what the last stages say comes before the end
  await new Promise((told) => setImmediate(told));
  const pages = readdirSync(folders.current, { recursive: true }).filter((file) =>
    String(file).endsWith('.html'),
  ).length;
  const seconds = ((performance.now() - start) / 1000).toFixed(1);
  const { id, proof } = loaded.input.edition;
  console.log(`${proof ? 'Proof edition, not for use,' : 'Edition'} of ${asOf}: ${id}`);
  console.log(`${out}: ${counted(count, 'formula')}, ${counted(pages, 'page')}, ${seconds} s`);
  return 0;
}

/** What the disk refused in words; what else went wrong as it was said. */
function reasonOf(error: unknown, out: string): unknown {
  if (!(error instanceof Error)) return error;
  return 'syscall' in error ? problemText(writeProblem(out, error)) : error.message;
}

/** Whether `inner` is `outer` or lies within it. */
function holds(outer: string, inner: string): boolean {
  const path = relative(outer, resolve(inner));
  return path === '' || !(path.startsWith('..') || isAbsolute(path));
}
