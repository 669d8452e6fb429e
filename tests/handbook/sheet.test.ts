import { beforeAll, describe, expect, test } from 'vitest';
import { withCautions } from '../../src/cautions/with-cautions.ts';
import { withDigests } from '../../src/edition/with-digests.ts';
import type { ComputedFormula, Formulary } from '../../src/formulary/formulary.ts';
import { loadFormulary } from '../../src/formulary/load.ts';
import { nameOf } from '../../src/handbook/names.ts';
import { benchSheet } from '../../src/handbook/sheet.ts';
import { releaseCheckRows } from '../../src/handbook/sheet-release.ts';
import { proofText } from '../../src/handbook/standing.ts';
import { words } from '../../src/words/catalogue.ts';

const AS_OF = '2026-12-01';
let formulary: Formulary;

beforeAll(() => {
  const loaded = loadFormulary({ formulas: 'formulas', data: 'data' });
  if (!loaded.ok) throw new Error(JSON.stringify(loaded.problems, null, 2));
  formulary = withDigests(withCautions(loaded.formulary, AS_OF));
});

const weighed = () =>
  formulary.formulas.flatMap((computed) =>
    computed.document.batches
      .filter(({ refused }) => !refused)
      .map((batch) => ({
        computed,
        batch,
        sheet: benchSheet(computed, batch, formulary.reference),
      })),
  );

describe('every sheet of the demo', () => {
  test('its lines add up to the sums that it prints', () => {
    for (const { computed, sheet } of weighed()) {
      const sum = (names: readonly string[]) =>
        sheet.table.groups
          .filter(({ name }) => names.includes(name))
          .flatMap(({ lines }) => lines)
          .reduce((total, { text }) => total + Number(text), 0);
      const printed = (sheet.sums.match(/\d+(\.\d+)?(?= g)/g) ?? []).map(Number);
      expect(printed, computed.document.code).toHaveLength(3);
      const [lye = 0, , all = 0] = printed;
      expect(sum(['lye'])).toBeCloseTo(lye, 6);
      // the sum may be printed to coarser steps than its parts, never by more than one
      expect(Math.abs(sum(['lye', 'fats', 'trace', 'after-cook', 'dilution']) - all)).toBeLessThan(
        1,
      );
    }
  });

  test('every material has a lot to be compared, or says that it has none', () => {
    const { noLot } = words.sheetWords.stop;
    for (const { computed, sheet } of weighed()) {
      const { document } = computed;
      const named = sheet.lots.map(({ name }) => name).join(', ');
      for (const { id } of [...document.alkali, ...document.fats, ...document.afterCookFats]) {
        expect(named, document.code).toContain(nameOf(formulary.reference, id));
      }
      for (const { text } of sheet.lots)
        expect(text === noLot || /retest by \d+ \w+ \d{4}/.test(text)).toBe(true);
      // the first to be compared is what burns
      expect(sheet.lots[0]?.name).toMatch(/hydroxide/);
    }
  });

  test('no caution is lost between the front and the back, and no danger is on the back', () => {
    for (const { computed, sheet } of weighed()) {
      expect([...sheet.grave, ...sheet.others]).toHaveLength(computed.document.cautions.length);
      expect(sheet.others.some(({ severity }) => severity === 'danger')).toBe(false);
    }
  });

  test('the scale that every step belongs to is named for its check', () => {
    for (const { sheet } of weighed()) {
      const named = [...sheet.scales.matchAll(/steps of ([\d.]+) g/g)].map(([, step]) =>
        Number(step),
      );
      expect(named.toSorted((a, b) => a - b)).toEqual(sheet.table.steps);
    }
  });
});

test('lye without heat data is told as boiling hot, never passed over', () => {
  const unknown = weighed().filter(
    ({ computed }) => computed.document.lye.peakTemperature === null,
  );
  expect(unknown.length).toBeGreaterThan(0);
  for (const { sheet } of unknown) {
    expect(sheet.heat).toEqual({ text: words.sheetWords.heat.unknown, strong: true });
  }
});

test('a refused size has no sheet', () => {
  const [first] = formulary.formulas;
  const [batch] = first?.document.batches ?? [];
  if (!first || !batch) throw new Error('the demo has no batch');
  const refused = { ...batch, refused: { rule: 'size-too-small-for-scale', numbers: {} } };
  expect(() => benchSheet(first, refused, formulary.reference)).toThrow(RangeError);
});

test('a formula is fit for a sheet only with its own approval, in time, and a digest', () => {
  const [first] = formulary.formulas;
  const [batch] = first?.document.batches ?? [];
  if (!first || !batch) throw new Error('the demo has no batch');
  const approval = {
    by: 'A',
    on: '2026-11-01',
    reviewBy: '2027-11-01',
    fingerprint: first.document.fingerprint ?? '',
  };
  const proof = (
    change: Partial<ComputedFormula['formula']>,
    digest: string | null = batch.digest,
    asOf = AS_OF,
  ) => proofText({ ...first.formula, ...change }, first.document, { digest }, asOf);
  const { states, noDigest } = words.standingWords;
  expect(proof({ approval })).toBeNull();
  expect(proof({ approval }, null)).toBe(noDigest);
  expect(proof({ approval: null })).toBe(states['not-approved']);
  expect(proof({ approval: { ...approval, fingerprint: 'another' } })).toBe(
    states['changed-since-approval'],
  );
  expect(proof({ approval }, batch.digest, '2028-01-01')).toBe(states['review-date-passed']);
  const withdrawn = { on: '2026-11-02', reason: 'A test', by: 'A' };
  expect(() => proof({ approval, withdrawn })).toThrow(RangeError);
});

test('release checks are those that the formula limits, each with its standard', () => {
  const [first] = formulary.formulas;
  if (!first) throw new Error('the demo is empty');
  const release = { freeAlkali: 0.05, ph: [9, 10.5], moisture: null } as const;
  expect(releaseCheckRows({ ...first.formula, release })).toEqual([
    { what: 'Free alkali', limit: 'at most 0.05 % as NaOH', method: 'ISO 456, two samples' },
    { what: 'pH', limit: '9.0 to 10.5', method: 'ISO 4316, 10 g in 1 L of water*' },
  ]);
  const none = { freeAlkali: null, ph: null, moisture: null };
  expect(releaseCheckRows({ ...first.formula, release: none })).toEqual([]);
});
