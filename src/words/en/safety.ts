import { temperature } from '../measures.ts';
import { fixed } from '../numbers.ts';

/** The safety page around its sections. Sentences without a code or a source are common practice. */
export const safetyPage = {
  title: 'Safety',
  first:
    'The supplier’s safety data sheet comes first. Then the law of your place, your employer’s rules and the word of licensed people. Then this page. In an injury, do what the emergency services and a doctor say.',
  reading: 'About ten minutes. Read it whole before your first lye, and again every year.',
  poster: 'Poster for the wall',
  record: 'Record to sign',
  booklet:
    'This page prints on A5. For a booklet to fold, choose “booklet” in the printer’s window.',
  emergencyTitle: 'In an emergency',
  noEmergency:
    'NO EMERGENCY NUMBER IS SET FOR THIS SHOP. Nobody works with lye before the numbers stand in data/shop.yaml and here.',
  practice:
    'Sentences without a code are common practice, no source. Codes such as P305 mark official sentences, all listed at the end; where they say “several minutes”, the twenty minutes here are the longer and hold. The safety data sheet comes before this page.',
  neverNeutralise: 'Never put vinegar, acid or any other “antidote” on skin or into eyes. Water.',
  firstAidTitle: 'First aid',
  firstAidLead:
    'Lye goes on burning after it has stopped hurting. Rinse at once, shout for help, let somebody else telephone.',
  tell: 'Say on the telephone: a corrosive alkali, sodium or potassium hydroxide; how strong (the percent on the bench sheet), if you know; which part of the body; since when; where you are. Label and safety data sheet go with the injured person.',
  firstAid: [
    {
      route: 'In the eyes',
      code: 'P305+P351+P338',
      short: 'Rinse, lids open, without stopping. Somebody telephones.',
      practice:
        'Within seconds, with the nearest clean water. Hold the lids open; rinse from the nose outwards, so that nothing runs into the other eye. Go on for twenty minutes at the very least, and until help takes over, also on the way. Every splash of lye in an eye is an emergency: the emergency services are called at once, and the rinsing goes on all the way there.',
    },
    {
      route: 'On the skin or in the hair',
      code: 'P303+P361+P353',
      short: 'Brush off dry alkali, clothes off, water, twenty minutes.',
      practice:
        'Brush off dry alkali first. Clothes, shoes and rings off under running water; cut a pullover rather than drag it over the face. What sticks to the skin stays on it and is rinsed over. Go on for twenty minutes at the very least. No cream, no oil. Skin that feels soapy is not rinsed yet. Redness that stays, a blister, the face, the hands or a large area: doctor.',
    },
    {
      route: 'Swallowed',
      code: 'P301+P330+P331',
      short: 'Rinse the mouth, spit. No vomiting. Telephone at once.',
      practice:
        'Call the emergency number at once. Nothing to neutralise it, nothing to eat; drink only what the poison centre or a doctor says.',
    },
    {
      route: 'Breathed in',
      code: 'P304+P340',
      short: 'Fresh air, sit upright, telephone, also when the cough goes away.',
      practice:
        'Sit upright in fresh air. Ask a doctor or the poison centre even when the cough goes away: swelling can come later.',
    },
  ],
  always: 'P310',
  laundry: 'P363',
  rulesTitle: 'Rules of this shop',
  careTitle: 'What here needs most care',
  careLead:
    'Reckoned from the formulas of this edition. Superfat is the part of the fats that the alkali leaves over; below zero it is alkali that is left over, and the soap burns. A formula below the shop’s limit stands here only with a written permission (a concession), and its page says why.',
  careDangers: 'With a caution marked danger',
  careNone: 'No formula carries a caution marked danger.',
  careHottest: 'Hottest lye, if it lost no heat',
  careUnknown: 'Lye heat without a number: reckon with boiling',
  careLowest:
    'Lowest superfat, errors of the scales counted (a batch size is named where it lies lowest)',
  celsius: (value: number) => temperature(value),
  percent: (value: number) => `${fixed(value, 1)} %`,
  officialTitle: 'Official statements',
  workplaceTitle: 'Workplace limits',
  workplace: [
    'Sodium hydroxide: NIOSH recommended ceiling 2 mg/m³; OSHA permissible limit 2 mg/m³ as an 8-hour mean; immediately dangerous to life or health 10 mg/m³ (cdc.gov/niosh/idlh/1310732.html, read 2026-12-01).',
    'Potassium hydroxide: NIOSH recommended ceiling 2 mg/m³, no OSHA limit in force (from memory).',
    'Other countries have their own.',
  ],
  signTitle: 'Sign that you have read it',
  sign: 'Every new maker before the first lye, and everybody once a year. Print the record, go through it with an experienced maker, sign both, keep it with the bench records.',
} as const;
