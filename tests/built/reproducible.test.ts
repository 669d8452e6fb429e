import { execFileSync } from 'node:child_process';
import {
  cpSync,
  mkdirSync,
  mkdtempSync,
  readdirSync,
  readFileSync,
  rmSync,
  symlinkSync,
  writeFileSync,
} from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath, pathToFileURL } from 'node:url';
import { afterAll, expect, inject, test } from 'vitest';

const ROOT = fileURLToPath(new URL('../..', import.meta.url));
/** What a copy of the project does without: what a build leaves behind, and what is linked. */
const NOT_COPIED = ['node_modules', 'dist', 'tests'];

/** Runs before the command and puts its clock 400 days forward. */
const CLOCK = `const Real = Date;
const shift = 400 * 864e5;
globalThis.Date = class extends Real {
  constructor(...given) {
    given.length > 0 ? super(...given) : super(Real.now() + shift);
  }
  static now() {
    return Real.now() + shift;
  }
};
`;

const elsewhere = mkdtempSync(join(tmpdir(), 'another folder '));
afterAll(() => rmSync(elsewhere, { recursive: true, force: true }));

test('the same inputs give the same bytes in another folder, time zone and year', () => {
  const site = inject('site');
  const { asOf } = JSON.parse(readFileSync(join(site, 'edition.json'), 'utf8')) as { asOf: string };
  const copy = join(elsewhere, 'x');
  mkdirSync(copy);
  for (const part of readdirSync(ROOT)) {
    if (part.startsWith('.') || NOT_COPIED.includes(part)) continue;
    cpSync(join(ROOT, part), join(copy, part), { recursive: true });
  }
  symlinkSync(join(ROOT, 'node_modules'), join(copy, 'node_modules'), 'junction');
  writeFileSync(join(copy, 'clock.mjs'), CLOCK);
  const clock = pathToFileURL(join(copy, 'clock.mjs')).href;
  execFileSync(
    process.execPath,
    ['--import', clock, 'src/commands/run.js', 'build', '--drafts', '--as-of', asOf],
    {
      cwd: copy,
      // the test runner's own DEV and NODE_ENV go along: they must not reach the pages
      env: { ...process.env, TZ: 'Pacific/Kiritimati' },
      stdio: ['ignore', 'ignore', 'pipe'],
    },
  );
  const sums = (folder: string) => readFileSync(join(folder, 'sha256sums.txt'), 'utf8').split('\n');
  const [here, there] = [sums(site), sums(join(copy, 'dist'))];
  const differing = [...here, ...there].filter(
    (line) => !here.includes(line) || !there.includes(line),
  );
  expect(differing).toEqual([]);
}, 300_000);
