import { relative, resolve } from 'node:path';
import { fileURLToPath } from 'node:url';
import { dev } from 'astro';
import { isCalendarDate } from '../formulary/calendar-date.ts';
import { handOver } from '../site/input.ts';
import { previewProblems } from '../site/integrations/preview-problems.ts';
import type { Problem } from '../words/problem.ts';
import { counted, problemSummary, problemText } from '../words/problem-text.ts';
import { FOLDERS, readArguments } from './arguments.ts';
import { asOfFor } from './as-of.ts';
import { loadSite } from './load-site.ts';
import { speakFor } from './speak-for.ts';

// the preview must not tell anybody that it ran
process.env.ASTRO_TELEMETRY_DISABLED = '1';

const PROJECT = fileURLToPath(new URL('../..', import.meta.url));
/** Editors save in several steps; one reload is enough. [ms] */
const SETTLE = 120;

/**
 * Serves the handbook while it is being written. A broken file shows its problems in the page and in the
 * terminal; the preview recovers when it is mended. Runs until it is stopped.
 */
export async function main(args: readonly string[]): Promise<number | undefined> {
  const read = readArguments(args, {
    command: 'dev',
    about: 'Shows the handbook while it is being written.',
    options: {
      ...FOLDERS,
      'as-of': { value: 'DATE', about: 'the date the edition is of (today)' },
      port: { value: 'NUMBER', about: 'port to listen on (4321, or the next free one)' },
    },
  });
  if (!read.ok) {
    console.error(read.text);
    return read.status;
  }
  const { formulas = 'formulas', data = 'data' } = read.given;
  speakFor(data);
  const asOf = asOfFor(read.given['as-of'], data);
  const port = Number(read.given.port ?? 4321);
  if (!isCalendarDate(asOf)) {
    console.error(`--as-of: "${asOf}" is no date. Write it like 2026-12-01.`);
    return 1;
  }
  if (!Number.isInteger(port) || port < 1 || port > 65535) {
    console.error(`--port: "${read.given.port}" is no port. Write a number from 1 to 65535.`);
    return 1;
  }

  let problems: readonly Problem[] = [];
  const load = () => {
    const loaded = loadSite({ formulas, data }, { asOf, drafts: true });
    if (loaded.ok) handOver(loaded.input, loaded.input.edition.id);
    problems = loaded.ok ? [] : loaded.problems;
    // warnings are counted only: while a shop writes, most formulas are not approved yet
    for (const problem of problems) console.error(problemText(problem));
    const count = loaded.ok
      ? `${counted(loaded.input.formulary.formulas.length, 'formula')}, `
      : '';
    console.log(count + problemSummary(loaded.problems));
  };
  load();

  const server = await dev({
    root: PROJECT,
    logLevel: 'warn',
    server: { port },
    vite: { logLevel: 'warn' },
    integrations: [previewProblems(() => problems)],
  });
  const watched = [resolve(formulas), resolve(data)];
  server.watcher.add(watched);
  let timer: NodeJS.Timeout | undefined;
  server.watcher.on('all', (_event, path) => {
    if (!watched.some((folder) => !relative(folder, resolve(path)).startsWith('..'))) return;
    clearTimeout(timer);
    timer = setTimeout(() => {
      load();
      reload();
    }, SETTLE);
  });
  // the pages are made anew from a module that has changed, so the list of pages is too
  const reload = () => server.watcher.emit('change', resolve(PROJECT, 'src/site/input.ts'));
  console.log(`Preview at http://localhost:${server.address.port}/`);
  return undefined;
}
