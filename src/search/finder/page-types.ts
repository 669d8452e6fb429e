/** What a page is about; the index carries it as a filter, and the finder lists pages of one type by it. */
export const PAGE_TYPES = ['formulas', 'materials', 'safety', 'methods'] as const;

export type PageType = (typeof PAGE_TYPES)[number];

/** The filter's name in the index. */
export const PAGE_FILTER = 'page';

/** The type of that name, or `null` where there is none. */
export const pageTypeOf = (name: string): PageType | null =>
  PAGE_TYPES.find((type) => type === name) ?? null;
