import { describe, expect, test } from 'vitest';
import { approvalOf } from '../../src/edition/approval.ts';
import { approvedShop, FORMULA, LOTS, shopWith } from './shop.ts';

const approval = { by: 'x', on: '2026-03-01', reviewBy: '2027-03-01', fingerprint: 'same' };
const withdrawn = { on: '2026-05-01', reason: 'r', by: 'x' };

describe('the state of a formula on a day', () => {
  test.each([
    ['approved', approval, null, 'same', '2026-03-01'],
    ['approved', approval, null, 'same', '2027-03-01'],
    ['review-date-passed', approval, null, 'same', '2027-03-02'],
    ['changed-since-approval', approval, null, 'other', '2026-03-01'],
    ['changed-since-approval', approval, null, 'other', '2028-03-01'],
    ['not-approved', approval, null, 'same', '2026-02-28'],
    ['not-approved', null, null, 'same', '2026-03-01'],
    ['withdrawn', approval, withdrawn, 'same', '2026-06-01'],
    ['withdrawn', approval, withdrawn, 'same', '2026-04-01'],
    ['withdrawn', null, withdrawn, 'same', '2026-06-01'],
  ])('%s', (state, approval, withdrawn, fingerprint, day) => {
    expect(approvalOf({ approval, withdrawn }, fingerprint, day)).toBe(state);
  });
});

describe('an edition', () => {
  test('is made of approved formulas', () => {
    const { proof, states } = approvedShop().edition();
    expect(proof).toBe(false);
    expect([...states]).toEqual([['TT-001', 'approved']]);
  });

  test('is refused for each that is not, with the command that mends it', () => {
    const shop = shopWith();
    expect(shop.load()).toMatchObject({
      ok: false,
      problems: [{ rule: 'edition/not-approved', severity: 'error', line: 2, column: 7 }],
    });
    expect(shop.load().problems[0]?.advice).toBe(
      'npm run approve -- TT-001 --by NAME --until DATE',
    );
    shop.approve();
    expect(shop.load().ok).toBe(true);
    expect(shop.rules({ asOf: '2027-12-01' })).toEqual([]);
    expect(shop.rules({ asOf: '2027-12-02' })).toEqual(['edition/review-date-passed']);
    expect(shop.rules({ asOf: '2026-11-30' })).toEqual(['edition/approved-later']);
    shop.edit('TT-001.md', 'Stir', 'Pour');
    expect(shop.rules()).toEqual(['edition/changed-since-approval']);
    expect(shop.rules({ asOf: '2026-02-30' })).toEqual(['edition/as-of-date']);
  });

  test('as a proof holds it and says so; its sheets are current nowhere', () => {
    const edition = shopWith().edition({ drafts: true });
    expect(edition.proof).toBe(true);
    expect(edition.document.proof).toBe(true);
    expect(edition.states.get('TT-001')).toBe('not-approved');
    expect(edition.sheets.current).toEqual([]);
    expect(shopWith().load({ drafts: true }).problems).toMatchObject([{ severity: 'warning' }]);
  });
});

describe('lots', () => {
  test('a new one inside its range changes the weights digest and no fingerprint', () => {
    const shop = approvedShop();
    const before = shop.edition();
    shop.setLots(LOTS.replace('O-1', 'O-2').replace('190.4', '189.2'));
    const after = shop.edition();
    const entryOf = ({ document }: typeof before) => {
      const [entry] = document.formulas;
      if (entry?.state !== 'approved') throw new Error('not approved');
      return entry;
    };
    expect(entryOf(after).fingerprint).toBe(entryOf(before).fingerprint);
    expect(entryOf(after).digests.pilot).not.toBe(entryOf(before).digests.pilot);
    expect(entryOf(after).digests.tray).not.toBe(entryOf(before).digests.tray);
  });

  test('another number on the same bag changes what a sheet says', () => {
    const shop = approvedShop();
    const { sheets } = shop.edition();
    shop.setLots(LOTS.replace('O-1', 'O-2'));
    expect(shop.edition().sheets.current).not.toEqual(sheets.current);
  });

  test('a label, a telephone number or a rule of the house changes no digest', () => {
    const shop = approvedShop();
    const { sheets } = shop.edition();
    shop.editSettings('label: Tray', 'label: Tray of 48');
    shop.editSettings('Call your local emergency number', 'Ring 000');
    shop.editSettings('Goggles and gloves.', 'Goggles, gloves and an apron.');
    const after = shop.edition().sheets;
    expect(after.current).toEqual(sheets.current);
    expect(after.edition).not.toBe(sheets.edition);
  });

  test('another step of the scale changes the weights digest and no fingerprint', () => {
    const shop = approvedShop();
    const { sheets } = shop.edition();
    shop.editSettings('step: 1 g', 'step: 0.1 g');
    expect(shop.edition().sheets.current).not.toEqual(sheets.current);
  });

  test('one outside its range is an error that names the formulas', () => {
    const shop = approvedShop();
    shop.setLots(LOTS.replace('190.4', '199.9'));
    expect(shop.load({ drafts: true })).toMatchObject({ ok: false });
    expect(shop.load({ drafts: true }).problems).toMatchObject([
      { rule: 'edition/lot-outside-window', severity: 'error' },
    ]);
    expect(shop.load().problems[0]?.expected).toContain('TT-001');
    shop.setLots(LOTS.replace('assay: 98.5', 'assay: 92.5'));
    expect(shop.rules()).toEqual(['edition/lot-outside-window']);
    shop.setLots(LOTS.replace('assay: 98.5', 'assay: 92.5').replaceAll('released', 'quarantine'));
    expect(shop.rules()).toEqual([]);
  });

  test('one outside its range that nothing uses is left alone', () => {
    const shop = approvedShop();
    shop.setLots(LOTS.replace('fat: olive', 'fat: castor'));
    expect(shop.rules()).toEqual([]);
  });
});

describe('a withdrawn formula', () => {
  const withdrawal = 'withdrawn: { on: 2026-11-01, reason: The mould is gone., by: Formulator }';
  const gone = FORMULA.replace('tags:', `${withdrawal}\ntags:`).replace('TT-001', 'TT-002');

  test('needs no approval, and nothing of an edition holds its weights', () => {
    const shop = shopWith({ 'TT-001.md': FORMULA, 'TT-002.md': gone });
    shop.approve();
    const edition = shop.edition();
    expect(edition.formulary.formulas.map(({ formula }) => formula.code)).toEqual(['TT-001']);
    expect(edition.withdrawn).toMatchObject([
      { code: 'TT-002', withdrawn: { reason: 'The mould is gone.' } },
    ]);
    const entry = edition.document.formulas[1];
    expect(Object.keys(entry ?? {}).sort()).toEqual([
      'code',
      'kind',
      'name',
      'revision',
      'state',
      'withdrawn',
    ]);
    expect(edition.sheets.withdrawn).toEqual([{ code: 'TT-002', on: '2026-11-01' }]);
    expect(JSON.stringify([edition.withdrawn, edition.sheets])).not.toMatch(/mass|olive/);
  });

  test('is not approved by mistake', () => {
    const shop = shopWith({ 'TT-002.md': gone });
    expect(shop.approve('TT-002')).toMatchObject([{ rule: 'edition/formula-withdrawn' }]);
  });
});
