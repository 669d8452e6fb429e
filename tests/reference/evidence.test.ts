import { describe, expect, test } from 'vitest';
import { readEvidence } from '../../src/reference/evidence/read-evidence-fs.ts';
import { rowsFrom } from '../support/evidence.ts';
import { packagedReference } from '../support/packaged-reference.ts';

const reference = packagedReference();
const { rows, problems } = readEvidence('data', reference);

describe('computed against published', () => {
  test('no problem is left over: every row agrees or has its reason', () => {
    expect(problems).toEqual([]);
  });

  test.each(rows.filter(({ disagreement }) => disagreement === null).map((row) => [row.id, row]))(
    '%s',
    (_, row) => {
      expect(
        Math.abs(row.deviation),
        `${row.subject}: computed ${row.computed} ${row.unit}, off by ${row.deviation}`,
      ).toBeLessThanOrEqual(row.tolerance);
    },
  );

  test('at least 120 rows from at least 12 publications that were read', () => {
    const read = rows.filter(({ how }) => how !== 'from memory' && how !== 'common practice');
    expect(read.length).toBeGreaterThanOrEqual(120);
    expect(new Set(read.map(({ source }) => source)).size).toBeGreaterThanOrEqual(12);
  });

  test('few rows may disagree, and none of an unnamed fat', () => {
    const known = rows.filter(({ agrees }) => !agrees);
    expect(known.length).toBeLessThanOrEqual(8);
    for (const row of known) expect(row.disagreement?.length).toBeGreaterThan(40);
  });
});

describe('the table cannot hide a failure', () => {
  test('a published value that is not reproduced is a problem', () => {
    const { problems } = rowsFrom(
      { model: 'molar-mass', of: 'NaOH', published: 41, tolerance: 0.1 },
      reference,
    );
    expect(problems).toMatchObject([
      {
        rule: 'data/evidence-disagrees',
        found: 'molar-mass/NaOH/jecfa-koh: computed 39.997, off by -1.00 g/mol',
        expected: 'at most 0.100 off what is published',
      },
    ]);
  });

  test('a reason that is no longer needed is a problem', () => {
    const { problems } = rowsFrom(
      { model: 'molar-mass', of: 'NaOH', published: 40, tolerance: 0.1 },
      reference,
      [{ id: 'molar-mass/NaOH/jecfa-koh', reason: 'none' }],
    );
    expect(problems).toMatchObject([
      {
        rule: 'data/stale-exception',
        found: '"molar-mass/NaOH/jecfa-koh", which agrees or is not there',
      },
    ]);
  });

  test('a record that its model cannot serve is a problem', () => {
    const { problems } = rowsFrom(
      { model: 'mean-ester-mass', of: 'whale', published: 600, tolerance: 1 },
      reference,
    );
    expect(problems).toMatchObject([
      {
        rule: 'data/evidence-without-number',
        found: '"whale", for which the model mean-ester-mass gives no number',
      },
    ]);
  });
});
