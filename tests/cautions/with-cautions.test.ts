import { expect, test } from 'vitest';
import { gravest } from '../../src/cautions/gravest.ts';
import { withCautions } from '../../src/cautions/with-cautions.ts';
import type { CautionDocument } from '../../src/formulary/document.ts';
import { alkaliLot, computedWith, REFERENCE } from './context.ts';

test('fills the cautions of every formula and leaves all else as it was', () => {
  const { computed } = computedWith({});
  const before = structuredClone(computed.document);
  const { formulas } = withCautions({ reference: REFERENCE, formulas: [computed, computed] });
  expect(formulas).toHaveLength(2);
  for (const { document } of formulas) {
    expect(document.cautions.length).toBeGreaterThan(0);
    expect({ ...document, cautions: [] }).toEqual({ ...before, cautions: [] });
  }
  expect(computed.document).toEqual(before);
});

test('speaks of dates only where a day is given, and of a date that has passed', () => {
  const { computed, reference } = computedWith({
    reference: (data) => ({
      ...data,
      lots: { fats: [], alkalis: [alkaliLot({ retestBy: '2026-11-30' })] },
    }),
  });
  const formulary = { reference, formulas: [computed] };
  const retest = (asOf?: string) =>
    withCautions(formulary, asOf).formulas[0]?.document.cautions.find(
      ({ id }) => id === 'alkali-lot-retest',
    );
  expect(retest()).toBeUndefined();
  expect(retest('2026-12-01')?.numbers).toMatchObject({ days: -1 });
  expect(retest('2026-12-01')?.action).toContain('Do not weigh from it');
});

const caution = (severity: CautionDocument['severity']): CautionDocument => ({
  id: severity,
  severity,
  numbers: {},
  text: '',
  action: '',
  basis: '',
});

test('a card shows the gravest, every danger among them, and counts the rest', () => {
  const cautions = [...'dd'].map(() => caution('danger')).concat(caution('care'), caution('note'));
  expect(gravest({ cautions }, 3)).toEqual({ shown: cautions.slice(0, 3), more: 1 });
  expect(gravest({ cautions }, 1)).toEqual({ shown: cautions.slice(0, 2), more: 2 });
  expect(gravest({ cautions: [] }, 3)).toEqual({ shown: [], more: 0 });
});
