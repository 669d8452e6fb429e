import { dateText } from '../dates.ts';
import { fixed } from '../numbers.ts';

/** Words of the page of what an edition has new. */
export const changesPage = {
  title: 'Changes',
  about: 'what this edition has new; the revisions of every formula',
  since: (id: string, asOf: string) => `Against edition ${id} of ${dateText(asOf)}.`,
  first:
    'No earlier edition was given to this build, so there is nothing to compare with. The revisions of each formula stand below.',
  nothing: 'Nothing has changed since then.',
  addedTitle: 'New',
  back: 'in use again',
  changedTitle: 'Changed',
  changedLead: 'Grams for 1000 g of fats, with the lots in force at each time.',
  reweighedTitle: 'Weighed otherwise',
  reweighedLead:
    'The formula is the same; lots, scales or batch sizes are not. Sheets printed before are superseded.',
  withdrawnTitle: 'Withdrawn',
  withdrawn: (on: string, reason: string) => `on ${dateText(on)}: ${reason}`,
  goneTitle: 'No longer there',
  historyTitle: 'Revisions',
  columns: {
    what: 'What',
    before: 'Before',
    after: 'Now',
    revision: 'Revision',
    date: 'Date',
    note: 'Change',
  },
  revisions: (before: number, now: number) =>
    before === now ? `revision ${now}` : `revision ${before} to ${now}`,
  none: '–',
  share: (name: string) => `${name}, share`,
  parts: { water: 'Water', heldBack: 'Water held back' } as Readonly<Record<string, string>>,
  superfat: 'Superfat, as written',
  lowestExpanded: 'Lowest superfat, expanded',
  lowestWorstCase: 'Lowest superfat, worst case',
  profile: {
    saturated: 'Saturated acids',
    monounsaturated: 'Acids with one double bond, ricinoleic too',
    polyunsaturated: 'Polyunsaturated acids',
    saponificationValue: 'Saponification value of the fats',
    iodineValue: 'Iodine value of the fats',
    oxidisability: 'Oxidisability, COX',
    meanChainLength: 'Mean chain length',
  },
  units: {
    saturated: '%',
    monounsaturated: '%',
    polyunsaturated: '%',
    saponificationValue: 'mg KOH/g',
    iodineValue: 'g I₂/100 g',
    oxidisability: '',
    meanChainLength: 'carbons',
  },
  percent: (value: number) => `${fixed(value, 2)} %`,
} as const;
