import { priceUnit } from '../measures.ts';

/** Cost as a property of the finder. Apart from its other words, which stand in every edition's scripts. */
export const findCost = {
  group: 'Cost',
  name: 'Cost of the materials by mass of batter',
  unit: (currency: string) => `${currency}/${priceUnit()}`,
} as const;
