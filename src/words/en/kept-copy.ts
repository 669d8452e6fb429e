import { dateText } from '../dates.ts';

/** What a page says that comes from the copy of an edition on the device. */
export const keptCopy = {
  label: 'Copy on this device',
  checking:
    'This page comes from the copy kept on this device. Whether the site has another edition is being looked up.',
  current: (id: string, keptOn: string) =>
    `Kept on this device on ${dateText(keptOn)}. The site has the same edition, ${id}.`,
  unchecked: (id: string, asOf: string, keptOn: string) =>
    `This copy is edition ${id} of ${dateText(asOf)}, kept on this device on ${dateText(keptOn)}. It is not checked against the site, which cannot be reached: weights may have changed since.`,
  unknown:
    'This page comes from a copy kept on this device. It is not checked against the site: weights may have changed since.',
  other: (id: string, asOf: string, keptOn: string, siteId: string, siteAsOf: string) =>
    `This copy is edition ${id} of ${dateText(asOf)}, kept on this device on ${dateText(keptOn)}. The site now has edition ${siteId} of ${dateText(siteAsOf)}: weights may have changed.`,
  rebuilt: (id: string, asOf: string, keptOn: string) =>
    `This copy is edition ${id} of ${dateText(asOf)}, kept on this device on ${dateText(keptOn)}. The site has built this edition anew: pages may have changed.`,
  replaced:
    'This page is of an edition that this device no longer keeps. Load the page anew before you weigh.',
  take: 'Take the edition of the site',
  taking: 'The edition of the site is being taken. Until it is whole, this copy stays as it is.',
  notTaken:
    'The edition of the site could not be taken whole. The copy on this device is as it was: weights may have changed since.',
  notKeptTitle: 'Not in this copy',
  notKept: [
    'This page is not in the copy of the handbook that this device keeps. It has not been read here yet, or it belongs to another edition.',
    'With a network, take the edition of the site if the notice above offers it, then open the page again. Weigh nothing by another edition’s sheet in the meantime.',
  ],
  contents: 'To the contents of this copy',
} as const;
