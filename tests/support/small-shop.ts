import { mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import type { ShopFolders } from '../../src/formulary/formulary.ts';
import { writeSyntheticFormulary } from '../bench/synthetic-formulary.ts';

/** A shop of three invented formulas, three sizes each, in `folder`. */
export const writeSmallShop = (folder: string): ShopFolders => writeSyntheticFormulary(folder, 3);

/** A change of one of a build's inputs, and whether pages of formulas that were not touched show it. */
export interface ShopChange {
  readonly name: string;
  readonly make: (shop: ShopFolders) => void;
  readonly options?: { readonly asOf?: string };
  /** Which formulas have other pages afterwards: all, the first alone, or none. */
  readonly touches: 'all' | 'first' | 'none';
}

/** One change of each kind of input. */
export const SHOP_CHANGES: readonly ShopChange[] = [
  {
    name: 'a number of a formula',
    make: inFirst(/superfat: \d+/, 'superfat: 9'),
    touches: 'first',
  },
  {
    name: 'a word of a method',
    make: inFirst('Fill the moulds', 'Fill all moulds'),
    touches: 'first',
  },
  {
    name: 'an approval, of the wrong fingerprint',
    make: inFirst(
      'tags:',
      'approval: { by: QA lead, on: 2026-11-01, review-by: 2027-11-01, fingerprint: 4f2a-91c0-7be3-5 }\ntags:',
    ),
    touches: 'first',
  },
  { name: 'the day', make: () => undefined, options: { asOf: '2026-12-02' }, touches: 'all' },
  {
    name: 'a value of the data',
    make: ({ data }) => {
      mkdirSync(join(data, 'fats'));
      const file = join(data, 'fats', 'olive.yaml');
      writeFileSync(file, packagedFat('olive').replace('max: 196', 'max: 197'));
    },
    touches: 'all',
  },
  { name: 'a telephone number', make: inShop('000 0142', '000 0143'), touches: 'all' },
  { name: 'the step of a scale', make: inShop('step: 1 g', 'step: 2 g'), touches: 'all' },
  {
    name: 'the language',
    make: inShop('invented: true', 'invented: true\nlocale: es'),
    touches: 'all',
  },
  {
    name: 'the units',
    make: inShop(
      'invented: true',
      'invented: true\nweights: us',
      'step: 0.1 g, error: 0.2 g, capacity: 2 kg',
      'step: 0.005 oz, error: 0.01 oz, capacity: 70 oz',
      'step: 1 g, error: 1 g, capacity: 15 kg',
      'step: 0.05 oz, error: 0.05 oz, capacity: 33 lb',
    ),
    touches: 'all',
  },
  {
    name: 'a lot',
    make: ({ data }) =>
      writeFileSync(
        join(data, 'lots.yaml'),
        `fats: []
alkalis:
  - { alkali: sodium-hydroxide, lot: XX-01, form: solid, assay: 98.5, uncertainty: 0.3, carbonate: 0.4, status: released, retest-by: 2027-03-01 }
`,
      ),
    touches: 'all',
  },
  {
    name: 'a price, which no such page may show',
    make: ({ data }) =>
      writeFileSync(
        join(data, 'prices.yaml'),
        'currency: XTS\nprices:\n  - { material: olive, per-kilogram: 6.43, on: 2026-11-02 }\n',
      ),
    touches: 'none',
  },
  {
    name: 'another formula that brings nuts to the equipment',
    make: ({ formulas }) => {
      const first = readFileSync(join(formulas, 'BM-0001.md'), 'utf8');
      const fats = 'fats:\n  - { fat: olive, share: 70 }\n  - { fat: walnut, share: 30 }\n';
      const other = first
        .replace('BM-0001', 'BM-0009')
        .replace(/fats:\n(?: {2}- .*\n)+/, fats)
        .replaceAll(/:weight\[[^\]]*\]/g, ':weight[walnut]');
      writeFileSync(join(formulas, 'BM-0009.md'), other);
    },
    touches: 'all',
  },
];

function inFirst(...changes: readonly (string | RegExp)[]) {
  return ({ formulas }: ShopFolders) => changeFile(join(formulas, 'BM-0001.md'), changes);
}

function inShop(...changes: readonly (string | RegExp)[]) {
  return ({ data }: ShopFolders) => changeFile(join(data, 'shop.yaml'), changes);
}

/** Each two are what is there and what takes its place. */
function changeFile(file: string, changes: readonly (string | RegExp)[]): void {
  const before = readFileSync(file, 'utf8');
  let text = before;
  for (let i = 0; i < changes.length; i += 2) {
    text = text.replace(changes[i] ?? '', String(changes[i + 1]));
  }
  if (text === before) throw new Error(`nothing to change in ${file}`);
  writeFileSync(file, text);
}

const packagedFat = (id: string) =>
  readFileSync(new URL(`../../data/fats/${id}.yaml`, import.meta.url), 'utf8');
