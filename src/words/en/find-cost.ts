/** Cost as a property of the finder. Apart from its other words, which stand in every edition's scripts. */
export const findCost = {
  group: 'Cost',
  name: 'Cost of materials per kilogram of batter',
  unit: (currency: string) => `${currency}/kg`,
} as const;
