import { readdirSync, readFileSync } from 'node:fs';
import type { DataFile } from '../../src/reference/data-files.ts';
import { type ReadReference, referenceFrom } from '../../src/reference/reference-from.ts';
import { problemText } from '../../src/words/problem-text.ts';

const SHOP = `name: Test shop
batches:
  - { id: pilot, label: Pilot, fats: 1 kg, losses: 3, scale: bench, fine-scale: fine, kinds: [bar] }
  - { id: tray, label: Tray, bars: 48, wet-mass: 118 g, scale: bench, kinds: [bar] }
  - { id: block, label: Block, mould: 12 L, scale: bench, vessel: 20 L, kinds: [bar] }
  - { id: pot, label: Pot, batter: 2.5 kg, scale: bench, kinds: [paste, liquid] }
scales:
  - { id: bench, name: Bench, step: 1 g, error: 1 g, capacity: 15 kg }
  - { id: fine, name: Fine, step: 0.1 g, error: 0.2 g, capacity: 2 kg }
start-temperature: 22 C
release-moisture: 12
largest-superfat-shift: 0.3
emergency:
  - { label: Invented, value: none }
release-limits:
  - { kind: any, process: any, end: expanded, floor: 0 }
`;

const LOTS = `fats:
  - { fat: olive, lot: O-1, saponification-value: 190.4, uncertainty: 0.8, method: ISO 3657, status: released, retest-by: 2027-06-01 }
  - { fat: olive, lot: O-2, saponification-value: 190.9, uncertainty: 0.8, method: ISO 3657, status: quarantine, retest-by: 2027-06-01 }
alkalis:
  - { alkali: sodium-hydroxide, lot: N-1, form: solid, assay: 98.5, uncertainty: 0.3, carbonate: 0.4, status: released, opened: 2026-10-12, retest-by: 2027-03-01 }
`;

const BLENDS = `firm:
  name: Firm base
  parts:
    - { fat: coconut, share: 60 }
    - { fat: shea, share: 40 }
`;

/** The packaged data with a shop of the tests' own, so that the demonstration shop may change freely. */
export const PACKAGED: readonly DataFile[] = [
  ...readdirSync('data', { recursive: true, encoding: 'utf8' })
    .map((name) => name.replaceAll('\\', '/'))
    .filter(
      (name) => name.endsWith('.yaml') && !/^(shop|lots|blends|prices|evidence)\.yaml$/.test(name),
    )
    .sort()
    .map((name) => file(name, readFileSync(`data/${name}`, 'utf8'))),
  file('shop.yaml', SHOP),
  file('lots.yaml', LOTS),
  file('blends.yaml', BLENDS),
];

export function file(name: string, text: string): DataFile {
  return { name, file: `data/${name}`, text, packaged: true };
}

/** The packaged data with one text of one file replaced; the text must stand there exactly once. */
export function withChange(name: string, from: string, to: string): readonly DataFile[] {
  return PACKAGED.map((entry) => {
    if (entry.name !== name) return entry;
    if (entry.text.split(from).length !== 2) throw new Error(`"${from}" is not once in ${name}`);
    return file(
      name,
      entry.text.replace(from, () => to),
    );
  });
}

export const read = (files: readonly DataFile[]): ReadReference => referenceFrom(files, 'data');

export const textsOf = ({ problems }: Pick<ReadReference, 'problems'>): string[] =>
  problems.map(problemText);

/** The reference of the packaged data. */
export function packagedReference() {
  const { reference, problems } = read(PACKAGED);
  if (!reference) throw new Error(textsOf({ problems }).join('\n'));
  return reference;
}
