import { fixed, plain } from '../numbers.ts';

/** Cautions about the finished soap: keeping, skin, feel, allergens. */
export const soapCautions = {
  'oxidises-early': (n: {
    polyunsaturated: number;
    oxidisability: number;
    limit: number;
    oxidisabilityLimit: number;
    protection: string;
  }) => ({
    text: `${fixed(n.polyunsaturated, 0)} % polyunsaturated acids, oxidisability ${fixed(n.oxidisability, 1)} (watched from ${plain(n.limit)} % or ${plain(n.oxidisabilityLimit, 1)}): it goes rancid early. ${n.protection === '' ? 'Nothing in it slows that.' : `Slowed by: ${n.protection}.`}`,
    action:
      n.protection === ''
        ? 'Keep storage short, cool and dark. Ask the formulator about an antioxidant and a chelator.'
        : 'Do not leave that out. Keep storage short, cool and dark.',
  }),
  'rapeseed-share': (n: { share: number; limit: number; most: number }) => ({
    text: `Low-erucic rapeseed oil is ${plain(n.share, 1)} % of the fats. Makers keep it at or under ${plain(n.limit)} to ${plain(n.most)} %: beyond that bars are soft and turn rancid.`,
    action: 'Watch stored bars for orange spots and smell, and sell the oldest first.',
  }),
  'castor-share': (n: { share: number; limit: number }) => ({
    text: `Castor oil is ${plain(n.share, 1)} % of the fats. Above ${plain(n.limit)} % bars turn sticky.`,
    action: 'Leave it longer in the mould and let bars dry apart from each other.',
  }),
  'strips-skin': (n: { share: number; limit: number; superfat: number }) => ({
    text: `Lauric and myristic acid are ${fixed(n.share, 0)} % of the acids, more than ${plain(n.limit)} %: such soap strips the skin of its own fat. Superfat ${plain(n.superfat, 1)} %.`,
    action: 'Say so to users with dry or broken skin; not for the face.',
  }),
  'hard-and-brittle': (n: { lauric: number; limit: number }) => ({
    text: `Lauric acid is ${fixed(n.lauric, 0)} % of the acids, more than ${plain(n.limit)} %: the bar sets hard and breaks when cut cold.`,
    action: 'Cut while still warm and soft, gloves on, or pour into single moulds.',
  }),
  'allergen-sources': (n: { sources: string }) => ({
    text: `From known sources of allergens: ${n.sources}.`,
    action:
      'Tell anyone at the bench with an allergy. Name them on the label, make this batch last, and wash the tools afterwards.',
  }),
} as const;
