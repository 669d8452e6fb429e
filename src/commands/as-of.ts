import { shopAhead } from '../reference/shop-ahead-fs.ts';

/** The one day that dates are compared with: the one given, the fixed day of an invented shop, or today. */
export const asOfFor = (given: string | undefined, data: string): string =>
  given ?? shopAhead(data).asOf ?? today();

/** Today in UTC, `2026-12-01`. */
const today = (): string => new Date().toISOString().slice(0, 10);
