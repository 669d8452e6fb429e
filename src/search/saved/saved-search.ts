import { z } from 'zod';

/** A search that the shop keeps: a page of its own in every edition. */
export interface SavedSearch {
  /** Part of the page's address. */
  readonly id: string;
  readonly title: string;
  readonly note: string | null;
  /** What stands after the `#` in the finder's address. */
  readonly search: string;
}

const text = z.string().trim().min(1).max(300);

/** `searches.yaml`. */
export const savedSearchesSchema = z.strictObject({
  searches: z.array(
    z.strictObject({
      id: z.string(),
      title: text,
      note: text.optional(),
      search: z.string().min(1).max(2000),
    }),
  ),
});
