import { spawnSync } from 'node:child_process';
import { mkdirSync, mkdtempSync, readdirSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, describe, expect, test } from 'vitest';
import { documentSchema } from '../../src/formulary/document-schema.ts';

const NODE = process.execPath;
const compute = (...args: string[]) =>
  spawnSync(NODE, ['src/commands/run.js', 'compute', ...args], { encoding: 'utf8' });
const folder = mkdtempSync(join(tmpdir(), 'compute-'));
afterAll(() => rmSync(folder, { recursive: true, force: true }));

/** A shop without lots: published ranges decide, so that the arithmetic below needs no lot. */
const SHOP = join(folder, 'data');
mkdirSync(SHOP);
writeFileSync(
  join(SHOP, 'shop.yaml'),
  `name: Test Bench
batches:
  - { id: one, label: One, fats: 1 kg, losses: 0, scale: fine, kinds: [bar, paste, liquid] }
scales:
  - { id: fine, name: Fine, step: 0.1 g, error: 0.1 g, capacity: 5 kg }
start-temperature: 20 C
release-moisture: 12
largest-superfat-shift: 0.3
emergency: []
rules: []
release-limits: []
`,
);
writeFileSync(join(SHOP, 'lots.yaml'), 'fats: []\nalkalis: []\n');

const formula = (front: string, code = 'TB-001') => {
  const file = join(folder, `${code}.md`);
  writeFileSync(
    file,
    `---
code: ${code}
name: Test
kind: bar
process: cold
revision: 1
${front}---
## Method

1. Weigh :weight[olive].
`,
  );
  return file;
};

describe('compute', () => {
  test('three formulas, reckoned by hand', () => {
    // assay without a lot: the top of the trade range, 99.5 % (from memory)
    const plain = formula(
      'fats:\n  - { fat: olive, share: 100 }\nalkali: { sodium: 100 }\nsuperfat: 5\nwater: { lye-concentration: 30 }\n',
    );
    const soft = formula(
      'fats:\n  - { fat: olive, share: 60 }\n  - { fat: coconut, share: 40 }\nalkali: { potassium: 100 }\nsuperfat: 3\nwater: { per-alkali: 2 }\n',
      'TB-002',
    );
    const mixed = formula(
      'fats:\n  - { fat: olive, share: 100 }\nalkali: { sodium: 50, potassium: 50, basis: moles }\nsuperfat: 0\nwater: { percent-of-fats: 40 }\n',
      'TB-003',
    );
    const run = compute(plain, soft, mixed, '--data', SHOP);
    expect(run.stderr).toBe('');
    const [one, two, three] = JSON.parse(run.stdout);
    // 1000 x 190 / 56105 = 3.386507 mol; x 0.95 x 39.997 / 0.995 = 129.3242 g; water 129.3242 x 7 / 3
    expect(one.equivalents.saponifiable).toBeCloseTo(3.386507, 6);
    expect(one.alkali[0].weighedMass).toBeCloseTo(129.3242, 3);
    expect(one.water).toBeCloseTo(301.7566, 3);
    // olive 190, coconut 256.5: (114000 + 102600) / 56105 = 3.860618; x 0.97 x 56.105 / 0.92 = 228.3717 g
    expect(two.equivalents.saponifiable).toBeCloseTo(3.860618, 6);
    expect(two.alkali[0].weighedMass).toBeCloseTo(228.3717, 3);
    expect(two.water).toBeCloseTo(456.7435, 3);
    // half of 3.386507 mol each: 1.693254 x 39.997 / 0.995 and x 56.105 / 0.92
    expect(three.alkali[0].weighedMass).toBeCloseTo(68.0654, 4);
    expect(three.alkali[1].weighedMass).toBeCloseTo(103.2609, 3);
    expect(three.water).toBeCloseTo(400, 9);
    // on the 0.1 g scale alkali goes down, and the superfat up from zero
    expect(
      three.batches[0].alkali.map((line: { weighedMass: number }) => line.weighedMass),
    ).toEqual([68, 103.2]);
    expect(three.batches[0].superfat.weighed).toBeGreaterThan(0);
  });

  test('one file gives one document, problems go to standard error and the status tells', () => {
    const good = compute(
      formula(
        'fats:\n  - { fat: olive, share: 100 }\nalkali: { sodium: 100 }\nsuperfat: 5\nwater: { lye-concentration: 30 }\n',
      ),
      '--data',
      SHOP,
    );
    expect(good.status).toBe(0);
    expect(JSON.parse(good.stdout).code).toBe('TB-001');
    const bad = compute(
      formula(
        'fats:\n  - { fat: olvie, share: 100 }\nalkali: { sodium: 100 }\nsuperfat: 5\nwater: { lye-concentration: 30 }\n',
      ),
      '--data',
      SHOP,
    );
    expect(bad.status).toBe(1);
    expect(bad.stdout).toBe('');
    expect(bad.stderr).toContain('did you mean "olive"?');
  });

  test('a breached release limit is no error here: it stands in the document', () => {
    const thin = formula(
      'fats:\n  - { fat: olive, share: 50 }\n  - { fat: shea, share: 50 }\nalkali: { sodium: 100 }\nsuperfat: 1\nwater: { lye-concentration: 30 }\n',
    );
    const run = compute(thin, '--data', SHOP);
    expect(run.status).toBe(0);
    expect(JSON.parse(run.stdout).release).toMatchObject({ met: false, concession: null });
  });

  test('every document of the demo keeps to its schema, and no number in it is missing', () => {
    const files = readdirSync('formulas').filter((name) => name.endsWith('.md'));
    const run = compute(...files.map((name) => join('formulas', name)));
    expect(run.stderr).toBe('');
    const documents = JSON.parse(run.stdout);
    expect(documents.length).toBe(files.length);
    for (const document of documents) {
      expect(() => documentSchema.parse(document)).not.toThrow();
      expect(JSON.stringify(document)).not.toContain('NaN');
      const {
        soap,
        glycerol,
        unsaponifiedFat,
        unsaponifiable,
        freeAlkali,
        water,
        carbonateAndInert,
        additives,
        total,
      } = document.yield;
      const sum =
        soap +
        glycerol +
        unsaponifiedFat +
        unsaponifiable +
        freeAlkali +
        water +
        carbonateAndInert +
        additives;
      expect(Math.abs(sum / total - 1)).toBeLessThan(1e-9);
    }
  });
});
