import type { FormulaDocument } from '../../src/formulary/document.ts';
import type { Reference } from '../../src/reference/reference.ts';
import type { lyeCautions } from '../../src/words/en/cautions-lye.ts';
import type { Cases } from './cases.ts';
import { alkaliLot } from './context.ts';

const lye = (wish: Partial<FormulaDocument['lye']>) => (document: FormulaDocument) => ({
  ...document,
  lye: { ...document.lye, ...wish },
});
const sodiumLot =
  (...lots: Parameters<typeof alkaliLot>) =>
  (reference: Reference) => ({
    ...reference,
    lots: { fats: [], alkalis: [alkaliLot(...lots)] },
  });
const potassium = { sodium: 0, potassium: 100, basis: 'moles' } as const;

export const LYE_CASES: Cases<keyof typeof lyeCautions> = {
  'lye-heat-near-boiling': {
    fires: { document: lye({ peakTemperature: 114, boilingPoint: 119 }) },
    numbers: { peak: 114, boiling: 119 },
    says: ['114 °C', '119 °C'],
    silent: { document: lye({ peakTemperature: 113.9, boilingPoint: 119 }) },
  },
  'lye-hot': {
    fires: { document: lye({ peakTemperature: 115, boilingPoint: 124 }) },
    numbers: { peak: 115, limit: 115 },
    says: ['115 °C', 'steel'],
    silent: { document: lye({ peakTemperature: 114.9, boilingPoint: 124 }) },
  },
  'lye-heat-unknown': {
    fires: { formula: { alkali: potassium } },
    numbers: { potassium: 100 },
    says: ['30 %', 'potassium hydroxide', 'it boils'],
    silent: {},
  },
  'lye-stronger-than-written': {
    // 30 % by 100/333: of 233 parts of water 11.5 kept back leave 100/321.5, 31.1 %
    fires: { formula: { water: { form: 'lye-concentration', value: 30, holdBack: 5 } } },
    numbers: { limit: 1 },
    says: ['31.1 %', '30.0 %'],
    silent: { formula: { water: { form: 'lye-concentration', value: 30, holdBack: 4 } } },
  },
  'lye-near-saturation': {
    // 46 % at 20 and 50 % at 25 degC: 47.6 % at the 22 degC of the test's shop
    fires: { document: lye({ pureAsMade: 42.7 }) },
    numbers: { temperature: 22, percent: 42.7 },
    says: ['42.7 %', '47.6 %', '22 °C'],
    silent: { document: lye({ pureAsMade: 42.5 }) },
  },
  'potassium-lye': {
    fires: { formula: { alkali: { sodium: 60, potassium: 40, basis: 'moles' } } },
    numbers: {},
    says: ['40 %'],
    silent: {},
  },
  'stock-lye': {
    fires: { reference: sodiumLot({ form: 'solution', assay: 50, carbonate: 0.1 }) },
    numbers: { lot: 'T-1', assay: 50 },
    says: ['T-1', '50.0 %', 'Sodium hydroxide'],
    silent: { reference: sodiumLot() },
  },
  'stock-crystallises': {
    // the table's own point, 50 % and 12 degC
    fires: { reference: sodiumLot({ form: 'solution', assay: 50, carbonate: 0.1 }) },
    numbers: { lot: 'T-1', assay: 50, crystals: 12 },
    says: ['T-1', '50.0 %', '12 °C', 'from memory'],
    // beyond the last point of the table
    silent: { reference: sodiumLot({ form: 'solution', assay: 50.1, carbonate: 0.1 }) },
  },
  'alkali-without-lot': {
    fires: { reference: sodiumLot({ status: 'quarantine' }) },
    numbers: { low: 98, high: 99.5, reckoned: 99.5 },
    says: ['Sodium hydroxide', '99.5 %'],
    silent: { reference: sodiumLot() },
  },
  'alkali-lot-retest': {
    fires: { reference: sodiumLot({ retestBy: '2027-01-30' }), asOf: '2026-12-31' },
    numbers: { days: 30, lot: 'T-1' },
    says: ['30 Jan 2027', '30 days', 'T-1'],
    silent: { reference: sodiumLot({ retestBy: '2027-01-31' }), asOf: '2026-12-31' },
  },
  'lye-and-metals': {
    fires: {},
    numbers: {},
    says: ['30 %', 'aluminium', 'zinc', 'tin'],
    // holds for every lye
    silent: null,
  },
};
