export const profileWords = {
  lead: 'Percent by mass of all fatty acids, after-cook fats included.',
  notGiven: 'No profile is given.',
  classes: {
    saturated: 'Saturated',
    monounsaturated: 'Monounsaturated',
    polyunsaturated: 'Polyunsaturated',
    hydroxy: 'Hydroxylated',
  },
  columns: { acid: 'Acid', share: 'Share' },
  sum: (name: string) => `${name}, together`,
} as const;

/** Names of the measures in the properties table, each with the id of its method. */
export const propertyNames = {
  superfat: 'Superfat, as written',
  saponificationValue: 'Saponification value of the fats',
  iodineValue: 'Iodine value of the fats',
  oxidisability: 'Oxidisability, COX',
  bisAllylic: 'Bis-allylic positions, BAPE',
  chainLength: 'Mean chain length of the acids',
  lyeConcentration: 'Lye concentration',
  lyeAsMade: 'Lye concentration in the pot',
  lyePeak: 'Lye temperature with no heat lost',
  totalFattyMatterFresh: 'Total fatty matter, fresh',
  totalFattyMatterReleased: 'Total fatty matter, at release',
  glycerolFresh: 'Glycerol, fresh',
  glycerolReleased: 'Glycerol, at release',
  moistureFresh: 'Water, fresh',
  moistureReleased: 'Water, at release',
  columns: { measure: 'Measure', value: 'Value', unit: 'Unit', method: 'Method' },
  method: 'method',
  noNumber: 'No number',
} as const;

export const propertyUnits = {
  percent: '%',
  mgKohPerGram: 'mg KOH/g',
  iodine: 'g I₂/100 g',
  carbons: 'carbons',
  none: 'no unit',
} as const;
