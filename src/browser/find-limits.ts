import type { Limit } from '../search/finder/limits.ts';
import { findWords } from '../words/en/find.ts';
import { element } from './find-dom.ts';
import { limitText } from './find-text.ts';

/** The limits in force, each with what dropping it would leave. Their buttons carry the limit's place. */
export function limitList(
  limits: readonly Limit[],
  rows: number,
  withoutLimit: readonly number[],
): readonly Node[] {
  if (limits.length === 0) return [];
  const items = limits.map(({ about }, place) => {
    const text = findWords.drop(limitText(about), withoutLimit[place] ?? 0);
    return element('li', {}, element('button', { type: 'button', 'data-limit': `${place}` }, text));
  });
  const lead = rows === 0 ? findWords.nothing : findWords.inForce;
  return [element('p', { class: 'label' }, lead), element('ul', {}, ...items)];
}
