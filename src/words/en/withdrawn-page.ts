import { dateText } from '../dates.ts';
/** What stands in place of a formula that was taken out of use. */
export const withdrawnPage = {
  title: 'Withdrawn. Do not make this.',
  by: (on: string, by: string) => `Taken out of use on ${dateText(on)} by ${by}.`,
  advice:
    'There are no weights of it any more. Sheets and cards that are still about belong in the bin. If a batch of it is in the works, stop and ask the formulator.',
} as const;
