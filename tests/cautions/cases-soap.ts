import type { FormulaDocument, Profile } from '../../src/formulary/document.ts';
import type { Formula } from '../../src/formulary/formula.ts';
import type { soapCautions } from '../../src/words/en/cautions-soap.ts';
import type { Cases } from './cases.ts';

const fats = (...shares: readonly (readonly [string, number])[]): Partial<Formula> => ({
  fats: shares.map(([fat, share]) => ({ fat, share })),
});
const profile = (wish: Partial<Profile>) => (document: FormulaDocument) => ({
  ...document,
  profile: document.profile && { ...document.profile, ...wish },
});

export const SOAP_CASES: Cases<keyof typeof soapCautions> = {
  'oxidises-early': {
    fires: {
      formula: { additives: [{ additive: 'rosemary-extract', percentOfFats: 0.1, at: 'fats' }] },
      document: profile({ polyunsaturated: 15.1, oxidisability: 2 }),
    },
    numbers: { polyunsaturated: 15.1, oxidisability: 2 },
    says: ['15 %', '2.0', 'Slowed by: Rosemary extract'],
    silent: { document: profile({ polyunsaturated: 15, oxidisability: 2.5 }) },
  },
  'rapeseed-share': {
    fires: { formula: fats(['olive', 79], ['rapeseed-lear', 21]) },
    numbers: { share: 21, limit: 20, most: 25 },
    says: ['21 %', '20 to 25 %'],
    silent: { formula: fats(['olive', 80], ['rapeseed-lear', 20]) },
  },
  'castor-share': {
    fires: { formula: fats(['olive', 94.5], ['castor', 5.5]) },
    numbers: { share: 5.5, limit: 5 },
    says: ['5.5 %', 'sticky'],
    silent: { formula: fats(['olive', 95], ['castor', 5]) },
  },
  'strips-skin': {
    fires: { document: profile({ acids: { 'C12:0': 21, 'C14:0': 9.1 } }) },
    numbers: { limit: 30 },
    says: ['30 %'],
    silent: { document: profile({ acids: { 'C12:0': 21, 'C14:0': 9 } }) },
  },
  'hard-and-brittle': {
    fires: { document: profile({ acids: { 'C12:0': 30.1 } }) },
    numbers: { lauric: 30.1 },
    says: ['30 %'],
    silent: { document: profile({ acids: { 'C12:0': 30 } }) },
  },
  'allergen-sources': {
    fires: { formula: fats(['olive', 90], ['almond', 10]) },
    numbers: {},
    says: ['tree nuts', 'Almond oil'],
    silent: { formula: fats(['olive', 90], ['castor', 10]) },
  },
};
