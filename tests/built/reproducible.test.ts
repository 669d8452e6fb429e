import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { pathToFileURL } from 'node:url';
import { afterAll, expect, inject, test } from 'vitest';
import { buildWithCopy, copyProject } from '../support/project-copy.ts';

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
  copyProject(copy);
  writeFileSync(join(copy, 'clock.mjs'), CLOCK);
  const clock = pathToFileURL(join(copy, 'clock.mjs')).href;
  buildWithCopy(copy, ['--drafts', '--as-of', asOf], {
    imports: [clock],
    env: { TZ: 'Pacific/Kiritimati' },
  });
  const sums = (folder: string) => readFileSync(join(folder, 'sha256sums.txt'), 'utf8').split('\n');
  const [here, there] = [sums(site), sums(join(copy, 'dist'))];
  const differing = [...here, ...there].filter(
    (line) => !here.includes(line) || !there.includes(line),
  );
  expect(differing).toEqual([]);
}, 300_000);
