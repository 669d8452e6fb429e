import { mkdirSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll } from 'vitest';
import { completeApproval, prepareApproval } from '../../src/edition/approve-fs.ts';
import { type EditionOptions, loadEdition } from '../../src/edition/load-edition-fs.ts';
import { sealEdition } from '../../src/edition/seal-fs.ts';
import { problemText } from '../../src/words/problem-text.ts';

const SETTINGS = `name: Workshop of a test
invented: true
batches:
  - { id: pilot, label: Pilot, fats: 1 kg, losses: 3, scale: bench, kinds: [bar, paste, liquid] }
  - { id: tray, label: Tray, bars: 48, wet-mass: 118 g, scale: bench, kinds: [bar] }
scales:
  - { id: bench, name: Bench scale, step: 1 g, error: 1 g, capacity: 15 kg }
start-temperature: 22 C
release-moisture: 12
largest-superfat-shift: 0.3
emergency:
  - { label: In an emergency, value: Call your local emergency number }
rules:
  - Goggles and gloves.
release-limits:
  - { kind: any, process: any, end: expanded, floor: 0 }
`;

/** A lot of sodium hydroxide and one of olive oil, both inside their ranges. */
export const LOTS = `fats:
  - { fat: olive, lot: O-1, saponification-value: 190.4, uncertainty: 0.8, method: ISO 3657, status: released, retest-by: 2029-06-01 }
alkalis:
  - { alkali: sodium-hydroxide, lot: N-1, form: solid, assay: 98.5, uncertainty: 0.3, carbonate: 0.4, status: released, retest-by: 2029-06-01 }
`;

export const FORMULA = `---
code: TT-001
name: Test Bar
kind: bar
process: cold
revision: 1
fats:
  - { fat: olive, share: 60 }
  - { fat: coconut, share: 40 } # the lathering part
alkali: { sodium: 100 }
superfat: 8
water: { lye-concentration: 32 }
tags: [plain]
---

## Method

1. Stir :alkali[sodium] into :water.
2. Melt :weight[coconut] with :weight[olive] and combine.
`;

export const AS_OF = '2026-12-01';

const root = mkdtempSync(join(tmpdir(), 'editions-'));
afterAll(() => rmSync(root, { recursive: true, force: true }));
let made = 0;

/** A new empty folder that goes away with the tests. */
export function emptyFolder(): string {
  const folder = join(root, String(made++));
  mkdirSync(folder);
  return folder;
}

/** A shop with these formulas, `{ 'TT-001.md': text }`, over the packaged data. */
export function shopWith(
  formulas: Readonly<Record<string, string>> = { 'TT-001.md': FORMULA },
  { lots = LOTS, settings = SETTINGS }: { lots?: string; settings?: string } = {},
) {
  const folder = emptyFolder();
  const folders = { formulas: join(folder, 'formulas'), data: join(folder, 'data') };
  mkdirSync(folders.formulas);
  mkdirSync(folders.data);
  writeFileSync(join(folders.data, 'shop.yaml'), settings);
  if (lots !== '') writeFileSync(join(folders.data, 'lots.yaml'), lots);
  const fileOf = (name: string) => join(folders.formulas, name);
  for (const [name, text] of Object.entries(formulas)) writeFileSync(fileOf(name), text);
  const shop = {
    folder,
    folders,
    ledger: join(folders.data, 'ledger.jsonl'),
    textOf: (name: string) => readFileSync(fileOf(name), 'utf8'),
    write: (name: string, text: string) => writeFileSync(fileOf(name), text),
    /** Changes one text in one file; it must stand there. */
    edit: (name: string, from: string, to: string) => {
      const text = shop.textOf(name);
      if (!text.includes(from)) throw new Error(`"${from}" is not in ${name}`);
      shop.write(name, text.replace(from, to));
    },
    editSettings: (from: string, to: string) => shop.edit('../data/shop.yaml', from, to),
    setLots: (text: string) => writeFileSync(join(folders.data, 'lots.yaml'), text),
    approve: (code = 'TT-001', wish: { by?: string; on?: string; until?: string } = {}) => {
      const request = { code, by: 'Quality lead', on: AS_OF, until: '2027-12-01', ...wish };
      const prepared = prepareApproval(folders, request);
      return prepared.ok ? completeApproval(prepared.pending) : prepared.problems;
    },
    load: (options: Partial<EditionOptions> = {}) =>
      loadEdition(folders, { asOf: AS_OF, ...options }),
    /** The edition, where there must be one. */
    edition: (options: Partial<EditionOptions> = {}) => {
      const loaded = shop.load(options);
      if (!loaded.ok) throw new Error(loaded.problems.map(problemText).join('\n'));
      return loaded.edition;
    },
    /** Rules of the problems, in order. */
    rules: (options: Partial<EditionOptions> = {}) =>
      shop.load(options).problems.map(({ rule }) => rule),
  };
  return shop;
}

/** A shop whose one formula is approved. */
export function approvedShop(lots = LOTS) {
  const shop = shopWith({ 'TT-001.md': FORMULA }, { lots });
  const problems = shop.approve();
  if (problems.length > 0) throw new Error(problems.map(problemText).join('\n'));
  return shop;
}

/** A folder as a build leaves it, with a page that says `text`. */
export function builtFolder(shop: ReturnType<typeof shopWith>, text = 'x', options = {}): string {
  const folder = join(emptyFolder(), 'dist');
  mkdirSync(join(folder, 'formulas'), { recursive: true });
  writeFileSync(join(folder, 'index.html'), text);
  writeFileSync(join(folder, 'formulas/TT-001.html'), text);
  sealEdition(folder, shop.edition(options).document);
  return folder;
}
