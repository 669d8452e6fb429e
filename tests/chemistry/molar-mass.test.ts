import { Molecule } from 'openchemlib';
import { describe, expect, test } from 'vitest';
import { molarMass } from '../../src/chemistry/molar-mass.ts';
import { CONSTANTS, WEIGHTS } from '../support/materials.ts';

/** Structures as SMILES, weighed by openchemlib, a general-purpose chemistry library. */
const STRUCTURES = [
  ['NaOH', '[Na+].[OH-]'],
  ['KOH', '[K+].[OH-]'],
  ['H2O', 'O'],
  ['C3H8O3', 'OCC(O)CO'],
  ['Na2CO3', '[Na+].[Na+].[O-]C([O-])=O'],
  ['K2CO3', '[K+].[K+].[O-]C([O-])=O'],
  ['C6H8O7', 'OC(=O)CC(O)(C(O)=O)CC(O)=O'],
  ['C3H6O3', 'CC(O)C(O)=O'],
  ['C2H4O2', 'CC(O)=O'],
  ['C12H24O2', 'CCCCCCCCCCCC(O)=O'],
  ['C16H32O2', 'CCCCCCCCCCCCCCCC(O)=O'],
  ['C18H36O2', 'CCCCCCCCCCCCCCCCCC(O)=O'],
  ['C18H34O2', 'CCCCCCCC/C=C\\CCCCCCCC(O)=O'],
  ['C18H32O2', 'CCCCC/C=C\\C/C=C\\CCCCCCCC(O)=O'],
  ['C18H30O2', 'CC/C=C\\C/C=C\\C/C=C\\CCCCCCCC(O)=O'],
  ['C18H34O3', 'CCCCCC[C@@H](O)C/C=C\\CCCCCCCC(O)=O'],
  ['C22H42O2', 'CCCCCCCC/C=C\\CCCCCCCCCCCC(O)=O'],
  ['C18H33O2Na', '[Na+].CCCCCCCC/C=C\\CCCCCCCC([O-])=O'],
  [
    'C57H104O6',
    'CCCCCCCC/C=C\\CCCCCCCC(=O)OCC(OC(=O)CCCCCCC/C=C\\CCCCCCCC)COC(=O)CCCCCCC/C=C\\CCCCCCCC',
  ],
] as const;

describe('molar mass', () => {
  test.each(STRUCTURES)('of %s agrees with openchemlib', (formula, smiles) => {
    const theirs = Molecule.fromSmiles(smiles).getMolecularFormula().relativeWeight;
    // the library carries more digits of the same weights: a few in 1e5
    expect(molarMass(formula, WEIGHTS) / theirs).toBeCloseTo(1, 4);
  });

  test('of potassium hydroxide is the 56.11 that JECFA prints', () => {
    expect(CONSTANTS.hydroxide.K).toBeCloseTo(56.11, 1);
    expect(Math.round(CONSTANTS.hydroxide.K * 100) / 100).toBeCloseTo(56.11, 2);
  });

  test('names what it cannot read', () => {
    expect(() => molarMass('NaXx', WEIGHTS)).toThrow('No atomic weight for "Xx"');
    expect(() => molarMass('Na(OH)', WEIGHTS)).toThrow('Cannot read the molecular formula');
    expect(() => molarMass('', WEIGHTS)).toThrow('Cannot read the molecular formula ""');
  });
});
