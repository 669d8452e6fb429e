import { totalMass } from '../measures.ts';
import { fixed } from '../numbers.ts';

export const shopping = {
  title: 'Shopping list',
  about: 'What chosen batches take together',
  lead: 'Choose how many of which batch; the list adds up what they take. Print it with the browser.',
  needsScripts:
    'Adding up needs scripts, which are off here. The tables below give what each batch takes.',
  broken:
    'The list cannot be made: shopping/data.js is missing or damaged. The tables below still hold.',
  choose: 'Batches',
  chooseLead: 'How many of each size. Empty means none.',
  count: (code: string, name: string, label: string) => `${code} ${name}, ${label}: how many`,
  clear: 'Start again',
  list: 'What to have ready',
  nothing: 'Nothing chosen yet.',
  chosen: (count: number, code: string, name: string, label: string) =>
    `${count} × ${code} ${name}, ${label}`,
  listNote:
    'Weights as on the formula pages. Nothing is added for spills, for what stays in a drum, or for a batch that fails.',
  stock: 'In stock',
  order: 'To order',
  material: 'Material',
  weight: 'Weight',
  water: 'Water',
  kilograms: (grams: number) => totalMass(grams),
  perBatch: 'What each batch takes',
  refused: 'No weights at any size.',
  formula: 'Formula',
  cost: 'Cost',
  perBar: 'Per bar',
  money: (amount: number, currency: string) => `${fixed(amount, 2)} ${currency}`,
  withCosts: 'With costs. This edition is not for the bench.',
  costNote: 'Materials only, at the shop’s prices; no work, energy, packaging or losses.',
  unpriced: (names: readonly string[]) => `Without: ${names.join(', ')} (no price).`,
} as const;
