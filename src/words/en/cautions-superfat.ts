import { dateText } from '../dates.ts';
import { fixed, plain } from '../numbers.ts';

const atSize = (batch: string) => (batch === '' ? '' : ` at size ${batch}`);

/** Cautions about what could be left of alkali or of fat. */
export const superfatCautions = {
  'free-alkali-possible': (n: { lowest: number; batch: string }) => ({
    text: `The superfat can fall to ${fixed(n.lowest, 2)} %${atSize(n.batch)}. Below zero the soap holds free alkali.`,
    action:
      'Gloves on for this soap until it has passed. Titrate every batch and hold it back while it shows free alkali above its limit.',
  }),
  'superfat-margin-thin': (n: { lowest: number; limit: number; batch: string }) => ({
    text: `The lowest superfat is ${fixed(n.lowest, 2)} %${atSize(n.batch)}, under the ${plain(n.limit)} % that would forgive a slip.`,
    action: 'Let a second person read every weight of fat and alkali, and test before release.',
  }),
  'acid-forgotten': (n: { superfat: number }) => ({
    text: `Part of the alkali is there for the acid. Without the acid the superfat would be ${fixed(n.superfat, 1)} %: a caustic soap.`,
    action:
      'Weigh the acid before the alkali and tick it off when it is in. Not sure that it went in? Stop the batch.',
  }),
  'concession-in-force': (n: { floor: number; lowest: number; by: string; on: string }) => ({
    text: `Made by concession below the release limit: lowest superfat ${fixed(n.lowest, 2)} %, limit ${plain(n.floor)} %. Given by ${n.by} on ${dateText(n.on)}.`,
    action: 'Read the reason on the formula page and keep every condition in it.',
  }),
  'after-cook-fats': (n: { materials: string; percent: number }) => ({
    text: `Joins after the cook: ${n.materials} (${plain(n.percent, 1)} % of the fats). No alkali is reckoned for it, and it would hide free alkali.`,
    action: 'Test the cooked soap for free alkali first. Only when it passes may this fat go in.',
  }),
  'wax-in-cold-process': (n: { materials: string; share: number }) => ({
    text: `Wax in cold process: ${n.materials} (${plain(n.share, 1)} % of the fats). The alkali is reckoned for it, yet it may hardly react.`,
    action: 'Melt it right through and work warm. Test for free alkali before release.',
  }),
  'superfat-high': (n: { superfat: number; limit: number }) => ({
    text: `${plain(n.superfat, 1)} % of the fat stays unsaponified, more than ${plain(n.limit)} %. The soap can stay soft and go rancid early.`,
    action: 'Cure it longer, keep it cool and dark, and sell the oldest first.',
  }),
} as const;
