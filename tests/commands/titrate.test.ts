import { spawnSync } from 'node:child_process';
import { expect, test } from 'vitest';
import { parse } from 'yaml';
import { lotsSchema } from '../../src/reference/schema/lots.ts';

const titrate = (...args: string[]) =>
  spawnSync(process.execPath, ['src/commands/run.js', 'titrate', ...args], { encoding: 'utf8' });
const EXAMPLE = ['--blank', '25.6', '--sample', '18.95', '--mass', '1.8976', '--normality', '1'];
const STATED = [
  ...['--volume-uncertainty', '0.02', '--mass-uncertainty', '0.0002'],
  ...['--normality-uncertainty', '0.001'],
];

// Simmons and Appleton 1908, chapter X: 1.8976 g of fat, 25.6 and 18.95 mL of N acid, printed 196.6
test('the printed example', () => {
  const { stdout, status } = titrate(...EXAMPLE);
  expect(status).toBe(0);
  expect(stdout).toContain('Saponification value 196.6 mg KOH/g');
});

test('without uncertainties there is no line to copy', () => {
  expect(titrate(...EXAMPLE).stdout).not.toContain('saponification-value:');
  expect(titrate(...EXAMPLE, '--volume-uncertainty', '0.02').stdout).not.toContain('retest-by:');
});

test('the line is one that lots.yaml takes, in quarantine', () => {
  const line = ['--fat', 'olive', '--lot', '26: 11', '--retest-by', '2027-06-01'];
  const { stdout } = titrate(...EXAMPLE, ...STATED, ...line);
  // by hand: 56.1/1.8976 = 29.564 per mL; x 0.02 x sqrt 2 = 0.836; 196.60 x 0.0002/1.8976 = 0.021;
  // 196.60 x 0.001 = 0.197; root of the squares 0.859, up to 0.9
  const [entry] = parse(stdout.split('\n').find((text) => text.startsWith('  - ')) ?? '');
  expect(entry).toEqual({
    fat: 'olive',
    lot: '26: 11',
    'saponification-value': 196.6,
    uncertainty: 0.9,
    method: 'ISO 3657',
    status: 'quarantine',
    'retest-by': '2027-06-01',
  });
  expect(lotsSchema.safeParse({ fats: [entry] }).success).toBe(true);
});

test('what is left open cannot pass as a lot', () => {
  const { stdout } = titrate(...EXAMPLE, ...STATED);
  const [entry] = parse(stdout.split('\n').find((text) => text.startsWith('  - ')) ?? '');
  expect(lotsSchema.safeParse({ fats: [entry] }).success).toBe(false);
});

test.each([
  ['a comma', [...EXAMPLE.slice(2), '--blank', '25,6'], '--blank'],
  ['a unit', [...EXAMPLE.slice(2), '--blank', '25.6mL'], '--blank'],
  ['nothing', [], '--blank, --sample, --mass, --normality are missing'],
  ['a sample above the blank', [...EXAMPLE.slice(2), '--blank', '18'], 'the blank above'],
  ['a mass of nothing', [...EXAMPLE, '--mass', '0'].filter((_, i) => i < 4 || i > 5), 'mass'],
  ['less than no uncertainty', [...EXAMPLE, '--mass-uncertainty=-1'], 'below zero'],
  [
    'milligrams for grams',
    [...EXAMPLE.filter((_, i) => i < 4 || i > 5), '--mass', '1897.6', ...STATED],
    '60 to 400',
  ],
])('refuses %s', (_, args, said) => {
  const { stdout, stderr, status } = titrate(...args);
  expect(status).toBe(1);
  expect(stdout).toBe('');
  expect(stderr).toContain(said);
});
