import { mkdirSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { WORDS } from '../search/synthetic-pages.ts';
import { chance } from '../support/chance.ts';

/** Fats that a workshop pours much and little of, by their ids in the packaged data. */
const BASES = ['olive', 'sunflower-ho', 'rapeseed-lear', 'tallow', 'lard', 'rice-bran', 'palm'];
const LAURICS = ['coconut', 'palm-kernel', 'babassu'];
const EXTRAS = ['shea', 'cocoa-butter', 'castor', 'almond', 'avocado', 'sesame', 'mango-kernel'];

const STEPS = [
  'Put on goggles, gloves and an apron; lay out the vessels.',
  'Weigh :weight[{base}] of the base into the pot and melt the rest with it.',
  'Weigh :weight[{lauric}] and stir it in until it is clear.',
  'Weigh :water of cold water into the jug.',
  'Add :alkali[sodium] to the water in portions. Alkali into water, every time.',
  'Cool both to :temperature[combine], with the jug covered and labelled.',
  'Pour the lye into the fats and blend in pulses to a light trace.',
  'Fill the moulds, smooth the tops, cover with a board.',
  'After :time[unmould] unmould with gloves on, cut, and stamp on the next day.',
  'Cure for :time[cure]. Turn weekly.',
];

const PLAIN_WORDS = WORDS.filter((word) => /^[a-z]+$/.test(word));

const SHOP = `# An invented workshop for measuring, made by a program.
name: Bench Measure Works
invented: true
as-of: 2026-12-01
batches:
  - { id: pilot, label: Pilot, fats: 1 kg, vessel: 5 L, losses: 3, scale: bench, fine-scale: fine, kinds: [bar, paste, liquid] }
  - { id: tray, label: Tray, fats: 6 kg, vessel: 15 L, losses: 3, scale: bench, fine-scale: fine, kinds: [bar, paste, liquid] }
  - { id: block, label: Block, fats: 11 kg, vessel: 25 L, losses: 2, scale: bench, fine-scale: fine, kinds: [bar, paste, liquid] }
scales:
  - { id: fine, name: Fine scale, step: 0.1 g, error: 0.2 g, capacity: 2 kg }
  - { id: bench, name: Bench scale, step: 1 g, error: 1 g, capacity: 15 kg }
start-temperature: 22 C
release-moisture: 12
largest-superfat-shift: 0.3
emergency:
  - { label: In an emergency (invented), value: 000 0142 }
release-limits:
  - { kind: any, process: any, end: expanded, floor: 0 }
`;

/**
 * Writes a formulary of `count` formulas that a workshop might have, three batch sizes each, with its shop, into
 * `folder`. The same numbers give the same files. A list of a smaller count is the beginning of a larger one.
 */
export function writeSyntheticFormulary(
  folder: string,
  count: number,
): { readonly formulas: string; readonly data: string } {
  const formulas = join(folder, 'formulas');
  const data = join(folder, 'data');
  mkdirSync(formulas, { recursive: true });
  mkdirSync(data, { recursive: true });
  writeFileSync(join(data, 'shop.yaml'), SHOP);
  const random = chance(20);
  for (let i = 1; i <= count; i++) {
    const code = `BM-${String(i).padStart(4, '0')}`;
    writeFileSync(join(formulas, `${code}.md`), formulaText(code, random));
  }
  return { formulas, data };
}

function formulaText(code: string, random: ReturnType<typeof chance>): string {
  const base = random.pick(BASES);
  const lauric = random.pick(LAURICS);
  const extras = [...new Set([random.pick(EXTRAS), random.pick(EXTRAS)])];
  const extra = 5 * (1 + random.below(3));
  const lauricShare = 15 + 5 * random.below(4);
  const fats = [
    { fat: base, share: 100 - lauricShare - extra * extras.length },
    { fat: lauric, share: lauricShare },
    ...extras.map((fat) => ({ fat, share: extra })),
  ];
  const name = `${random.pick(PLAIN_WORDS)} ${random.pick(PLAIN_WORDS)}`;
  const steps = STEPS.map(
    (step, i) => `${i + 1}. ${step.replace('{base}', base).replace('{lauric}', lauric)}`,
  );
  return `---
code: ${code}
name: ${name}
kind: bar
process: cold
revision: 1
fats:
${fats.map(({ fat, share }) => `  - { fat: ${fat}, share: ${share} }`).join('\n')}
alkali: { sodium: 100 }
superfat: ${6 + random.below(3)}
water: { lye-concentration: ${28 + random.below(6)} }
targets: { combine: 35-40 C, unmould: 24 h, cure: ${28 + 7 * random.below(4)} d }
release: { free-alkali: 0.05, ph: [9, 10.5], moisture: 12 }
tags: [${random.pick(['unscented', 'palm-free', 'winter'])}]
changes:
  - { revision: 1, on: 2026-09-14, note: "Written by a program, for measuring." }
---

## Method

${steps.join('\n')}

## Why it is made this way

${Array.from({ length: 30 + random.below(40) }, () => random.pick(PLAIN_WORDS)).join(' ')}.
`;
}
