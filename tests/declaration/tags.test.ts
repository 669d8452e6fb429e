import { expect, test } from 'vitest';
import { loadFormulary } from '../../src/formulary/load.ts';
import { claims } from '../../src/handbook/declaration/claims.ts';

const loaded = loadFormulary({ formulas: 'formulas', data: 'data' });
if (!loaded.ok) throw new Error(JSON.stringify(loaded.problems, null, 2));
const { formulas, reference } = loaded.formulary;

// a buyer who searches for a tag must find nothing that the label cannot say
test.each(formulas.map((computed) => [computed.formula.code, computed] as const))(
  '%s: each tag that is a claim holds by the data of its materials',
  (_code, { formula, charge }) => {
    const against = claims(charge, reference).filter(
      ({ claim, verdict }) => formula.tags.includes(claim) && verdict !== 'yes',
    );
    expect(against).toEqual([]);
  },
);
