import type { DataFile } from '../../src/reference/data-files.ts';
import type { DataRule } from '../../src/words/en/problems-data.ts';
import { file, PACKAGED, withChange } from './packaged-data.ts';

const without = (name: string) => PACKAGED.filter((entry) => entry.name !== name);
const withText = (name: string, text: string) => [...without(name), file(name, text)];

const SMALL_FAT = `name: Trial fat
inci: Trial Fat
kind: glyceride
origin: plant
`;
const OLIVE_LOT =
  'lot: O-2, saponification-value: 190.9, uncertainty: 0.8, method: ISO 3657, status: quarantine';

/** One broken example of each problem that can be shown without a disk. */
export const BROKEN: readonly {
  readonly rule: DataRule;
  readonly files: readonly DataFile[];
}[] = [
  { rule: 'data/missing-file', files: without('acids.yaml') },
  { rule: 'data/empty-file', files: withText('lots.yaml', '# nothing yet\n') },
  {
    rule: 'data/yaml',
    files: withChange('fats/olive.yaml', 'name: Olive oil', 'name: "Olive oil'),
  },
  { rule: 'data/tab', files: withText('fats/trial.yaml', 'name: Trial\nacids:\n\tC12:0: 1\n') },
  {
    rule: 'data/duplicate-key',
    files: withText('fats/trial.yaml', `${SMALL_FAT}palm: false\npalm: true\n`),
  },
  {
    rule: 'data/hidden-character',
    files: [
      ...withText('fats/trial.yaml', `# \u202Enot seen\n${SMALL_FAT}`).filter(
        ({ name }) => name !== 'lots.yaml',
      ),
      file('lots.yaml', 'fats:\n  - { fat: "ol\\u200Bive" }\n'),
    ],
  },
  { rule: 'data/anchor', files: withText('fats/trial.yaml', `${SMALL_FAT}notes: &all [one]\n`) },
  {
    rule: 'data/unknown-key',
    files: withText('fats/trial.yaml', `${SMALL_FAT}allergen: [milk]\n`),
  },
  {
    rule: 'data/missing-key',
    files: withText('fats/trial.yaml', SMALL_FAT.replace('inci: Trial Fat\n', '')),
  },
  { rule: 'data/wrong-type', files: withText('fats/trial.yaml', `${SMALL_FAT}palm: maybe\n`) },
  {
    rule: 'data/unknown-word',
    files: withText('fats/trial.yaml', SMALL_FAT.replace('glyceride', 'triglyceride')),
  },
  {
    rule: 'data/out-of-range',
    files: withText(
      'fats/trial.yaml',
      `${SMALL_FAT}saponification-value:\n  - { min: 18.4, max: 196, unit: mg KOH/g, source: bailey, at: here, how: handbook }\n`,
    ),
  },
  {
    rule: 'data/fixed-day',
    files: withChange('shop.yaml', 'name: Test shop', 'name: Test shop\nas-of: 2026-12-01'),
  },
  {
    rule: 'data/locale',
    files: withChange('shop.yaml', 'name: Test shop', 'name: Test shop\nlocale: tlh'),
  },
  {
    rule: 'data/untranslated-name',
    files: [
      ...withChange('shop.yaml', 'name: Test shop', 'name: Test shop\nlocale: es-MX'),
      file('fats/trial.yaml', SMALL_FAT),
    ],
  },
  { rule: 'data/text-form', files: withChange('shop.yaml', 'id: pilot', 'id: ../pilot') },
  { rule: 'data/measure-form', files: withChange('shop.yaml', 'fats: 1 kg', 'fats: 1') },
  { rule: 'data/date', files: withChange('lots.yaml', 'opened: 2026-10-12', 'opened: 2026-02-30') },
  {
    rule: 'data/value-or-range',
    files: withText(
      'fats/trial.yaml',
      `${SMALL_FAT}iodine-value:\n  - { value: 80, max: 90, unit: g I2/100 g, source: bailey, at: here, how: handbook }\n`,
    ),
  },
  {
    rule: 'data/range-order',
    files: withText(
      'fats/trial.yaml',
      `${SMALL_FAT}iodine-value:\n  - { min: 90, max: 80, unit: g I2/100 g, source: bailey, at: here, how: handbook }\n`,
    ),
  },
  {
    rule: 'data/unknown-source',
    files: withText(
      'fats/trial.yaml',
      `${SMALL_FAT}iodine-value:\n  - { min: 80, max: 90, unit: g I2/100 g, source: baily, at: here, how: handbook }\n`,
    ),
  },
  {
    rule: 'data/unknown-acid',
    files: withText(
      'fats/trial.yaml',
      `${SMALL_FAT}compositions:\n  - { source: bailey, at: here, how: handbook, acids: { C18:0: { value: 50 }, C19:0: { value: 50 } } }\n`,
    ),
  },
  {
    rule: 'data/unknown-fat',
    files: withChange('lots.yaml', `fat: olive, ${OLIVE_LOT}`, `fat: olvie, ${OLIVE_LOT}`),
  },
  {
    rule: 'data/unknown-alkali',
    files: withChange('lots.yaml', 'alkali: sodium-hydroxide', 'alkali: sodium-hydroxid'),
  },
  {
    rule: 'data/scale-units',
    files: withChange('shop.yaml', 'name: Test shop', 'name: Test shop\nweights: us'),
  },
  {
    rule: 'data/unknown-scale',
    files: withChange('shop.yaml', 'fine-scale: fine', 'fine-scale: fin'),
  },
  { rule: 'data/molecular-formula', files: withChange('additives.yaml', 'C6H5O7Na3', 'C6H5O7N3') },
  {
    rule: 'data/acid-form',
    files: withChange('acids.yaml', 'formula: C18H34O2', 'formula: C18H36O2'),
  },
  {
    rule: 'data/order-of-choice',
    files: withText(
      'fats/trial.yaml',
      `${SMALL_FAT}iodine-value:\n  - { min: 80, max: 90, unit: g I2/100 g, source: bailey, at: here, how: handbook }\n  - { min: 80, max: 91, unit: g I2/100 g, source: ph-eur, at: here, how: standard }\n`,
    ),
  },
  {
    rule: 'data/composition-sum',
    files: withText(
      'fats/trial.yaml',
      `${SMALL_FAT}compositions:\n  - { source: bailey, at: here, how: handbook, acids: { C18:0: { value: 50 }, C18:1: { min: 20, max: 40 } } }\n`,
    ),
  },
  {
    rule: 'data/computed-saponification-value',
    files: withChange('fats/cottonseed.yaml', 'min: 189\n    max: 198', 'min: 198.1\n    max: 199'),
  },
  {
    rule: 'data/computed-iodine-value',
    files: withChange('fats/cottonseed.yaml', 'min: 100\n    max: 123', 'min: 113\n    max: 123'),
  },
  {
    rule: 'data/stale-exception',
    files: withChange(
      'fats/olive.yaml',
      'kind: glyceride',
      'exceptions:\n  - { check: composition-sum, reason: once it did not sum }\nkind: glyceride',
    ),
  },
  {
    rule: 'data/no-trade-range',
    files: withChange('alkalis/sodium-hydroxide.yaml', 'min: 98\n    max: 99.5', 'min: 98'),
  },
  {
    rule: 'data/fat-of-liquid',
    files: withChange('liquids.yaml', '  fat: coconut', '  fat: coconot'),
  },
  {
    rule: 'data/table-order',
    files: withChange('tables/boiling-point.yaml', '[60, 160]', '[40, 160]'),
  },
  {
    rule: 'data/batch-size',
    files: withChange('shop.yaml', 'fats: 1 kg', 'fats: 1 kg, mould: 2 L'),
  },
  { rule: 'data/repeated-entry', files: withChange('lots.yaml', 'lot: O-2', 'lot: O-1') },
  {
    rule: 'data/two-released-lots',
    files: withChange('lots.yaml', 'status: quarantine', 'status: released'),
  },
  {
    rule: 'data/lot-dates',
    files: withChange('lots.yaml', 'opened: 2026-10-12', 'opened: 2027-10-12'),
  },
  {
    rule: 'data/lot-outside-range',
    files: withChange('lots.yaml', 'saponification-value: 190.4', 'saponification-value: 209.4'),
  },
  {
    rule: 'data/lot-acid-value',
    files: withChange(
      'lots.yaml',
      'saponification-value: 190.4,',
      'acid-value: 197, acid-uncertainty: 0.5, acid-method: ISO 660, saponification-value: 190.4,',
    ),
  },
  { rule: 'data/blend-id', files: withChange('blends.yaml', 'firm:', 'palm:') },
  {
    rule: 'data/blend-part',
    files: [
      ...withChange('blends.yaml', 'fat: shea', 'fat: trial'),
      file('fats/trial.yaml', SMALL_FAT),
    ],
  },
  { rule: 'data/blend-sum', files: withChange('blends.yaml', 'share: 40', 'share: 30') },
  { rule: 'data/lot-sum', files: withChange('lots.yaml', 'carbonate: 0.4', 'carbonate: 1.6') },
];
