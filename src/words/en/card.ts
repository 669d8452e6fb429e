import { dateText } from '../dates.ts';
/** Words of the bench card. Short: it is read at arm's length. */
export const cardWords = {
  title: (code: string, name: string, label: string) => `${code} ${name}, ${label}: bench card`,
  revision: (revision: number) => `Revision ${revision}`,
  fingerprint: (text: string) => `Formula ${text}`,
  digest: (text: string) => `weights ${text}`,
  asOf: (date: string) => `as of ${dateText(date)}`,
  lots: (lots: string) => `Only with lots ${lots}.`,
  noLots: 'No lots: reckoned on trade ranges.',
  order: 'Alkali into water, never water onto alkali.',
  more: (count: number) =>
    count === 1
      ? 'One more caution: read the formula page.'
      : `${count} more cautions: read the formula page.`,
  noCautions: 'The safety page holds for every batch.',
  side: (number: number, of: number) => `${number} of ${of}`,
  goesOn: (count: number) =>
    count === 1 ? 'Turn over: one more to weigh.' : `Turn over: ${count} more to weigh.`,
  continued: (group: string) => `${group}, continued`,
  scanned: 'Formula page',
  concession: (by: string) => `By concession of ${by}: reason on the formula page.`,
  invented: 'Demonstration: an invented workshop.',
  links: {
    sheet: 'Bench sheet',
    picture: 'Bench card',
    svg: 'SVG',
    png: 'PNG',
  },
} as const;
