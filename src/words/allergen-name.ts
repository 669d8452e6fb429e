import { words } from './catalogue.ts';

/** What a source of allergens of the data is called. */
export const allergenName = (source: string): string => words.frame.allergens[source] ?? source;
