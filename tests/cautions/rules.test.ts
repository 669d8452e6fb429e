import { describe, expect, test } from 'vitest';
import { SEVERITIES } from '../../src/cautions/rule.ts';
import { RULES } from '../../src/cautions/rules.ts';
import { cautionsOf } from '../../src/cautions/with-cautions.ts';
import type { CautionId } from '../../src/words/en/cautions.ts';
import type { Case } from './cases.ts';
import { LYE_CASES } from './cases-lye.ts';
import { SOAP_CASES } from './cases-soap.ts';
import { SUPERFAT_CASES } from './cases-superfat.ts';
import { WORK_CASES } from './cases-work.ts';
import { computedWith, REFERENCE, type Wish } from './context.ts';

// the types ask for a case of every caution there is
const CASES = { ...LYE_CASES, ...SUPERFAT_CASES, ...WORK_CASES, ...SOAP_CASES };

const cautions = (wish: Wish) => {
  const { computed, reference } = computedWith(wish);
  return cautionsOf(computed, reference, wish.asOf ?? null);
};

describe.each(Object.entries(CASES) as [CautionId, Case<CautionId>][])('%s', (id, example) => {
  test('speaks on its example, with its numbers in words', () => {
    const found = cautions(example.fires).filter((caution) => caution.id === id);
    expect(found).toHaveLength(1);
    expect(found[0]?.numbers).toMatchObject(example.numbers);
    const said = `${found[0]?.text} ${found[0]?.action}`;
    for (const words of example.says) expect(said).toContain(words);
    expect(said).not.toMatch(/undefined|NaN|\[object/);
  });

  test('says whether a source or common practice stands behind it', () => {
    const { basis } = cautions(example.fires).find((caution) => caution.id === id) ?? {};
    const sources = [...REFERENCE.sources.keys()];
    expect(['common practice, no source', 'reckoned here, see methods', ...sources]).toContain(
      basis,
    );
  });

  const { silent } = example;
  if (silent) {
    test('is silent on its neighbour', () => {
      expect(cautions(silent).map((caution) => caution.id)).not.toContain(id);
    });
  }
});

test('cautions come gravest first, and those of one severity in the order of the rules', () => {
  const found = cautions({
    formula: {
      process: 'hot',
      alkali: { sodium: 40, potassium: 60, basis: 'moles' },
      fats: [
        { fat: 'olive', share: 60 },
        { fat: 'castor', share: 10 },
        { fat: 'stearic-acid', share: 30 },
      ],
      afterCookFats: [{ fat: 'almond', percentOfFats: 3 }],
      additives: [{ additive: 'ethanol-96', percentOfFats: 5, at: 'after-cook' }],
    },
  });
  expect(found.map(({ severity, id }) => `${severity} ${id}`)).toEqual([
    'danger lye-heat-unknown',
    'danger alcohol-near-heat',
    'warning after-cook-fats',
    'warning hot-process-boil-over',
    'warning potassium-lye',
    'care free-acid-seizes',
    'care allergen-sources',
    'care lye-and-metals',
    'note castor-share',
  ]);
});

test('every rule stands under its own id with a severity that is known', () => {
  for (const [id, rule] of Object.entries(RULES)) {
    expect(rule.id).toBe(id);
    expect(SEVERITIES).toContain(rule.severity);
  }
});

test('a lye near boiling is not called hot a second time', () => {
  const found = cautions({
    document: (document) => ({
      ...document,
      lye: { ...document.lye, peakTemperature: 118, boilingPoint: 120 },
    }),
  }).map(({ id }) => id);
  expect(found).toContain('lye-heat-near-boiling');
  expect(found).not.toContain('lye-hot');
});

test('acid that is dissolved in the lye brings it near boiling, by the model and the data', () => {
  const strong = { form: 'lye-concentration', value: 32, holdBack: 0 } as const;
  const acid = { additive: 'citric-acid-monohydrate', percentOfFats: 2, at: 'lye' } as const;
  const ids = (formula: Wish['formula']) =>
    cautions({ formula: { ...formula } }).map(({ id }) => id);
  expect(ids({ water: strong, additives: [acid] })).toContain('lye-heat-near-boiling');
  expect(ids({ water: strong })).not.toContain('lye-heat-near-boiling');
});
