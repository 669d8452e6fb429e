import { statedMass } from '../measures.ts';
import { fixed, plain } from '../numbers.ts';

export const declaration = {
  names: {
    water: { eu: 'Aqua', us: 'Water' },
    perfume: { eu: 'Parfum', us: 'Fragrance' },
    glycerol: 'Glycerin',
  },
  noName: (metal: string, material: string) =>
    `[no INCI name in the data: ${metal} salt of ${material}]`,
  title: 'Label declaration',
  check:
    'A draft. The responsible person must check every name, the order and the claims before anything is printed.',
  lists: {
    formed: 'As formed: what the soap holds at release',
    added: 'As added: what goes in',
  },
  formedLead:
    'Soap named by its fat, glycerol, what stays unsaponified, and the water that is left. What alkali leaves of a fat and its unsaponifiable matter stand under the fat’s own name.',
  addedLead: 'The same soap by what is weighed. Use one list or the other, never a mixture.',
  regions: { eu: 'European Union: Ingredients', us: 'United States: Ingredients' },
  orders: {
    descending: '',
    'under-one-percent': 'under 1 %, in any order',
    colour: 'colour, in any order',
  },
  columns: { name: 'Name', share: 'Share', order: 'Order' },
  shares: 'Shares behind the order',
  share: (percent: number) => (percent < 0.1 ? 'under 0.1 %' : `${fixed(percent, 1)} %`),
  perfume:
    'Everything that scents stands together as Parfum (Fragrance); it may be named one by one where the responsible person prefers so.',
  allergensTitle: 'Fragrance allergens',
  allergens: (threshold: number) =>
    `Named above ${plain(threshold)} % of a product that is rinsed off, Regulation (EU) 2023/1545.`,
  allergen: (name: string, percent: number) => `${name}: at most ${fixed(percent, 3)} %`,
  noFragrance: 'Nothing in it is a fragrance by the data.',
  allergensNone: 'By the suppliers’ figures none is above the threshold.',
  allergensUnknown: (names: readonly string[]) =>
    `No supplier’s figures in the data for: ${names.join('; ')}. Take the names from the supplier’s allergen declaration; without it the list is not complete.`,
  netMassTitle: 'Net mass',
  netMass: (label: string, wet: number, released: number, moisture: number, ounces: number) =>
    `${label}: a bar poured at ${statedMass(wet)} is reckoned at ${fixed(released, 1)} g (${fixed(ounces, 2)} oz) when dried to ${plain(moisture, 1)} % water. It goes on drying: declare no more than the lightest bar weighs on the day of sale.`,
  netMassUnknown: 'Of what is filled by hand: declare what the scale shows.',
  namesBasis:
    'INCI names and names for the United States: from memory, not checked against the dictionary. Order of the list: Regulation (EC) 1223/2009, article 19, and 21 CFR 701.3, both from memory. In the United States a product that is soap and nothing else by 21 CFR 701.20 needs no list.',
  gap: 'A name is missing. Find it in the INCI dictionary before this list is used.',
  claimsTitle: 'What may be said of it',
  claims: { vegan: 'Vegan', 'palm-free': 'Palm-free', 'nut-free': 'Nut-free' },
  verdicts: { yes: 'by its ingredients', no: 'no', open: 'not claimed' },
  claimYes: {
    vegan: 'No ingredient is marked as of animal origin.',
    'palm-free': 'No ingredient is marked as from the oil palm.',
    'nut-free': 'No ingredient is marked as from tree nuts or peanut.',
  },
  claimNo: (names: readonly string[]) => `Because of: ${names.join('; ')}.`,
  claimOpen: (names: readonly string[]) =>
    `The data do not know enough of: ${names.join('; ')}. Ask the supplier.`,
  shared: (names: readonly string[]) =>
    `The shop’s equipment also meets: ${names.join('; ')}. That alone can rule the claim out.`,
} as const;
