import { execFileSync } from 'node:child_process';
import { readFileSync } from 'node:fs';
import { expect, test } from 'vitest';
import { billOfMaterials } from '../../src/edition/bill-of-materials.ts';

interface Bill {
  readonly components: readonly {
    readonly 'bom-ref': string;
    readonly purl: string;
    readonly scope: string;
    readonly hashes: readonly unknown[];
    readonly licenses?: readonly unknown[];
  }[];
}

const told = ({ components }: Bill) =>
  components
    .map(({ 'bom-ref': reference, purl, scope, hashes, licenses = [] }) =>
      JSON.stringify({ reference, purl, scope, hashes, licenses }),
    )
    .toSorted();

function fromNpm(...more: readonly string[]): Bill {
  const npm = process.platform === 'win32' ? 'npm.cmd' : 'npm';
  const args = ['sbom', '--sbom-format', 'cyclonedx', '--package-lock-only', ...more];
  return JSON.parse(execFileSync(npm, args, { encoding: 'utf8', maxBuffer: 2 ** 26 }));
}

test('the bill of materials says of each package what npm says of it', () => {
  const own: Bill = JSON.parse(billOfMaterials(readFileSync('package-lock.json', 'utf8')));
  const all = new Set(told(fromNpm()));
  expect(own.components.length).toBeGreaterThan(100);
  expect(told(own).filter((line) => !all.has(line))).toEqual([]);
});

test('the bill of materials leaves out nothing that the build needs', () => {
  const own = new Set(told(JSON.parse(billOfMaterials(readFileSync('package-lock.json', 'utf8')))));
  // npm leaves some of the direct dependencies out, where a test tool names them too
  expect(told(fromNpm('--omit', 'dev')).filter((line) => !own.has(line))).toEqual([]);
  for (const name of Object.keys(JSON.parse(readFileSync('package.json', 'utf8')).dependencies))
    expect(
      [...own].some((line) => line.includes(`"reference":"${name}@`)),
      name,
    ).toBe(true);
});

test('a package that one place needs is needed, and tests add nothing', () => {
  const of = (more: object) => ({ version: '1.0.0', integrity: 'sha512-AA==', ...more });
  const bill: Bill = JSON.parse(
    billOfMaterials(
      JSON.stringify({
        name: 'shop',
        version: '1.0.0',
        packages: {
          '': {},
          'node_modules/a': of({ optional: true, license: 'MIT OR ISC' }),
          'node_modules/b/node_modules/a': of({ license: 'MIT OR ISC' }),
          'node_modules/c': of({ dev: true }),
        },
      }),
    ),
  );
  expect(bill.components).toEqual([
    expect.objectContaining({
      purl: 'pkg:npm/a@1.0.0',
      scope: 'required',
      hashes: [{ alg: 'SHA-512', content: '00' }],
      licenses: [{ expression: 'MIT OR ISC' }],
    }),
  ]);
});
