import type { Sized } from '../chemistry/any-size.ts';
import { anySizeWords as text } from '../words/en/any-size.ts';
import { expectedMass, weighed as weighedText } from '../words/measures.ts';
import type { AnySizeData } from './any-size-data.ts';
import { shownGroups, stepsOf } from './any-size-lines.ts';
import { element } from './find-dom.ts';

/** What is said below the weights: sums, superfat, and a warning where the lowest superfat is thin. */
export function notes({ weighed, margin, total, as }: Sized, data: AnySizeData): readonly string[] {
  const losses = data.limits.listed[as]?.losses ?? 0;
  const [finest = 1] = stepsOf(shownGroups(weighed, data));
  const { low } = margin.expanded;
  return [
    `${text.total(weighedText(total, finest))} ${text.poured(expectedMass(total * (1 - losses)), losses)}`,
    text.superfat(100 * weighed.superfat, 100 * low),
    ...(low < data.thin ? [text.thin(100 * low, 100 * data.thin)] : []),
  ];
}

/** A box in which weights are refused or a batch is stopped. */
export const refusal = (title: string, reason: string, advice: string): HTMLElement =>
  element(
    'div',
    { class: 'refusal' },
    element('p', {}, element('strong', {}, title)),
    element('p', {}, reason),
    element('p', {}, element('b', {}, advice)),
  );
