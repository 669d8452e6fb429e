import { readdirSync, readFileSync } from 'node:fs';
import { parse, stringify } from 'yaml';
import { knownFrom } from '../../src/formulary/known.ts';
import { readFormula } from '../../src/formulary/read-formula.ts';
import type { DataFile } from '../../src/reference/data-files.ts';
import { referenceFrom } from '../../src/reference/reference-from.ts';
import type { Chance } from '../support/chance.ts';
import { computedFaults } from './computed-faults.ts';
import { mutateBytes } from './mutate-bytes.ts';
import { mutateValue } from './mutate-value.ts';
import { problemFaults } from './problem-faults.ts';
import type { Case } from './run.ts';

/** What some formulas need, and no more: every case reads all of it. */
const FATS = [
  'castor',
  'coconut',
  'cocoa-butter',
  'jojoba',
  'milk-fat',
  'olive',
  'shea',
  'stearic-acid',
];

const FILES: readonly DataFile[] = [
  ...readdirSync('data', { recursive: true, encoding: 'utf8' })
    .map((name) => name.replaceAll('\\', '/'))
    .filter(
      (name) =>
        name.endsWith('.yaml') &&
        !/^(fats\/|(evidence|searches|prices|blends|lots)\.yaml)/.test(name),
    )
    .sort(),
  ...FATS.map((id) => `fats/${id}.yaml`),
].map((name) => ({
  name,
  file: `data/${name}`,
  text: readFileSync(`data/${name}`, 'utf8'),
  packaged: true,
}));

const LOTS = `fats:
  - { fat: olive, lot: O-1, saponification-value: 190.4, uncertainty: 0.8, method: ISO 3657, status: released, retest-by: 2029-06-01 }
alkalis:
  - { alkali: sodium-hydroxide, lot: N-1, form: solid, assay: 98.5, uncertainty: 0.3, carbonate: 0.4, status: released, retest-by: 2029-06-01 }
`;
const BLENDS = `base:
  name: Base
  parts: [{ fat: coconut, share: 62.5 }, { fat: cocoa-butter, share: 37.5 }]
`;
const ALL: readonly DataFile[] = [
  ...FILES,
  { name: 'lots.yaml', file: 'data/lots.yaml', text: LOTS, packaged: false },
  { name: 'blends.yaml', file: 'data/blends.yaml', text: BLENDS, packaged: false },
];
/** The shop's own files are those that people write. */
const WRITTEN = [
  'shop.yaml',
  'lots.yaml',
  'blends.yaml',
  'additives.yaml',
  'liquids.yaml',
  'fats/olive.yaml',
];

const formula = (front: string) => `---
code: QY-900
name: Trial
revision: 1
superfat: 8
concession: { reason: A trial., by: Nobody, on: 2026-11-01 }
${front}
---

## Method

1. Stir :lye into the fats.
`;
const FORMULAS = [
  formula(
    'kind: bar\nprocess: cold\nfats: [{ fat: olive, share: 60 }, { fat: shea, share: 20 }, { blend: base, share: 20 }]\nalkali: { sodium: 100 }\nwater: { lye-concentration: 32, hold-back: 10 }\nliquids: [{ liquid: goat-milk, replaces-water: 40, at: trace }]\nadditives: [{ additive: citric-acid, percent-of-fats: 1, at: lye }]',
  ),
  formula(
    'kind: liquid\nprocess: hot\nfats: [{ fat: coconut, share: 70 }, { fat: castor, share: 20 }, { fat: jojoba, share: 5 }, { fat: stearic-acid, share: 5 }]\nalkali: { potassium: 90, sodium: 10, basis: moles }\nwater: { per-alkali: 3 }',
  ),
];

/** The data with other values in one file: refused with a place in that file, or formulas are sound with them. */
export function otherData(random: Chance): Case {
  return withText(random, (text) => {
    const value: unknown = parse(text);
    mutateValue(value, random, [
      ...FATS,
      'base',
      'sodium-hydroxide',
      'pilot',
      'bench',
      'C18:1',
      'cxs-33-1981',
    ]);
    return random.below(4) === 0
      ? JSON.stringify(value)
      : stringify(value, { lineWidth: 0, aliasDuplicateObjects: false });
  });
}

/** The same with damaged bytes that are still UTF-8. */
export const damagedData = (random: Chance): Case =>
  withText(random, (text) => mutateBytes(Buffer.from(text), random).toString('utf8'));

function withText(random: Chance, change: (text: string) => string): Case {
  const name = random.below(3) === 0 ? random.pick(ALL).name : random.pick(WRITTEN);
  const before = ALL.find((file) => file.name === name)?.text ?? '';
  const text = change(before);
  const files = ALL.map((file) => (file.name === name ? { ...file, text } : file));
  const { reference, problems } = referenceFrom(files, 'data');
  const textOf = (path: string) => files.find(({ file }) => file === path)?.text ?? '';
  const input = `${name}:\n${text.slice(0, 20_000)}`;
  if (!reference) {
    const faults = problems.flatMap((problem) => problemFaults(problem, textOf(problem.file)));
    return { faults: problems.length === 0 ? ['refused without a reason'] : faults, input };
  }
  const known = knownFrom(reference);
  const faults = FORMULAS.flatMap((written) => {
    const read = readFormula(written, 'a.md', known);
    return read.formula
      ? computedFaults(read.formula, reference, written)
      : read.problems.flatMap((problem) => problemFaults(problem, written));
  });
  return { faults, input };
}
