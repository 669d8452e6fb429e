/**
 * How a build grows with the formulary: `npm run bench` for 100 and 1,000 formulas, `npm run bench -- 5000` for as many.
 * Each size is built from nothing and again after a change of one formula, in a copy of the project with its own
 * kept pages and cards, beside two floors that are measured in the same minutes.
 *
 * Drawing a card costs far more than all else and happens once for each content, so it is measured apart, on a few
 * cards; the builds find copies of one drawn card under the names of all others.
 */
import { mkdirSync, mkdtempSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { loadavg } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { copyProject } from '../support/project-copy.ts';
import { AS_OF, fillCards } from './fill-cards.ts';
import { frameworkFloor, writingFloor } from './floors.ts';
import { type Measured, measureNode, stagesOf } from './formulary-build.ts';
import { writeSyntheticFormulary } from './synthetic-formulary.ts';

const CARDS_DRAWN = 5;

const counts = process.argv.slice(2).map(Number);
if (counts.some((count) => !Number.isInteger(count) || count < 1)) {
  throw new Error('say how many formulas: npm run bench -- 5000');
}
// below the project, so that the framework finds its packages
const cache = fileURLToPath(new URL('../../.cache', import.meta.url));
mkdirSync(cache, { recursive: true });
const folder = mkdtempSync(join(cache, 'bench-'));
try {
  const project = join(folder, 'project');
  copyProject(project);
  for (const count of counts.length > 0 ? counts : [100, 1000]) await measure(project, count);
} finally {
  rmSync(folder, { recursive: true, force: true });
}

async function measure(project: string, count: number): Promise<void> {
  const place = join(folder, String(count));
  const shop = writeSyntheticFormulary(place, count);
  const { milliseconds, cards } = await fillCards(shop, join(project, '.cache/cards'), CARDS_DRAWN);
  const out = join(place, 'dist');
  const build = () =>
    measureNode(
      project,
      [
        'src/commands/run.js',
        'build',
        '--drafts',
        ...['--as-of', AS_OF, '--formulas', shop.formulas, '--data', shop.data, '--out', out],
      ],
      join(place, 'watch'),
    );
  const clean = await build();
  const framework = await frameworkFloor(out, join(place, 'framework'));
  const writing = writingFloor(out, join(place, 'written'));
  const first = join(shop.formulas, 'BM-0001.md');
  writeFileSync(first, readFileSync(first, 'utf8').replace(/superfat: \d+/, 'superfat: 9'));
  const changed = await build();
  const pages = readdirSync(out, { recursive: true, encoding: 'utf8' }).filter((path) =>
    path.endsWith('.html'),
  ).length;
  rmSync(place, { recursive: true });

  console.log(`\n${count} formulas, ${pages} pages, ${cards} cards found drawn`);
  console.log(`one card takes ${milliseconds.toFixed(0)} ms to draw (${CARDS_DRAWN} drawn)`);
  row('', 'wall', 'memory', 'a formula', 'to the framework');
  const line = (name: string, { seconds, megabytes }: Measured) =>
    row(
      name,
      `${seconds.toFixed(1)} s`,
      `${megabytes.toFixed(0)} MB`,
      `${((seconds / count) * 1000).toFixed(1)} ms`,
      (seconds / framework.seconds).toFixed(2),
    );
  line('build from nothing', clean);
  line('after one change', changed);
  line('framework, same pages', framework);
  row('writing the same bytes', `${writing.toFixed(1)} s`);
  console.log(
    `aims: from nothing at most 1.5 times the framework; after one change at most 0.25 of it from nothing: ${(changed.seconds / clean.seconds).toFixed(2)}`,
  );
  const after = stagesOf(changed.output);
  row('stage', 'nothing', 'share', 'a formula', 'one change');
  for (const [stage, seconds] of stagesOf(clean.output)) {
    row(
      stage,
      `${seconds.toFixed(1)} s`,
      `${((seconds / clean.seconds) * 100).toFixed(0)} %`,
      `${((seconds / count) * 1000).toFixed(1)} ms`,
      `${(after.get(stage) ?? 0).toFixed(1)} s`,
    );
  }
  console.log(
    `load average of the machine: ${loadavg()
      .map((each) => each.toFixed(1))
      .join(', ')}`,
  );
}

function row(name: string, ...cells: readonly string[]): void {
  console.log(name.padEnd(24) + cells.map((cell) => cell.padStart(11)).join(''));
}
