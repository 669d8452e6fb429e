import { dateOf, type Property } from '../search/finder/finder-data.ts';
import type { LimitSubject } from '../search/finder/limits.ts';
import { dateText } from '../words/dates.ts';
import { findWords } from '../words/en/find.ts';
import { fixed } from '../words/numbers.ts';

/** A value as it is shown, with its unit. */
export function valueText(value: number | null, property: Property): string {
  if (value === null) return findWords.noValue;
  if (property.format === 'date') return dateText(dateOf(value));
  const number = fixed(value, property.decimals);
  return property.unit === '' ? number : `${number} ${property.unit}`;
}

/** A limit in words. */
export function limitText(about: LimitSubject): string {
  const names = findWords.limitNames;
  switch (about.kind) {
    case 'words':
      return names.words(about.words);
    case 'range': {
      const { property, range } = about;
      const [from, to] = [valueText(range.min, property), valueText(range.max, property)];
      if (range.min === range.max) return names.exactly(property.name, from);
      if (range.max === null) return names.least(property.name, from);
      if (range.min === null) return names.most(property.name, to);
      return names.between(property.name, from, to);
    }
    case 'with':
    case 'without':
      return names[about.kind](about.names.join(findWords.or));
    default:
      return names[about.kind](about.trait.name, about.names.join(findWords.or));
  }
}
