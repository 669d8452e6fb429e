import type { Sized } from '../chemistry/any-size.ts';
import { type AtTheBench, type Correction, correct } from '../chemistry/correction.ts';
import type { Breach } from '../chemistry/quantity.ts';
import { sizeSheetWords as text } from '../words/en/any-size.ts';
import { expectedMass, weighed } from '../words/measures.ts';
import type { AnySizeData, NamedLine } from './any-size-data.ts';
import { refusal } from './any-size-notes.ts';
import { refusalText } from './any-size-refusal.ts';
import { element, part } from './find-dom.ts';
import { benchFields } from './size-sheet-bench.ts';
import { todoText } from './size-sheet-todo.ts';

/** The weights that the page shows: as asked for, or as they must become; none while the batch is stopped. */
export type Redraw = (sized: Sized | null, state: 'asked' | 'corrected' | 'stopped') => void;

/** The form for what was weighed wrong; every change of it is answered at once. */
export function correctionForm(data: AnySizeData, redraw: Redraw): (planned: Sized | null) => void {
  const form = part('correction-form');
  let planned: Sized | null = null;
  let fields: ReturnType<typeof benchFields> | null = null;

  const say = (sentence: string, ...rest: readonly Node[]) => {
    part('correction-said').textContent = sentence;
    part('correction-todo').replaceChildren(...rest);
  };
  const stop = (breach: Breach) => {
    redraw(null, 'stopped');
    const met = breach.rule === 'lye-has-met-fats';
    const title = met ? text.metTitle : text.stopTitle;
    const advice = met ? text.metAdvice : text.stopAdvice;
    say(title, refusal(title, refusalText(breach, text.refusals), advice));
  };
  const answer = () => {
    const read = fields?.read();
    if (!planned || !read) return;
    if (!read.ok) {
      // with a reading that cannot be read, no weights are sure
      redraw(null, 'stopped');
      say(read.sentence);
      return;
    }
    const { bench } = read;
    const outcome = correct(planned, bench, data.strongestLye, data.limits, data.constants);
    if (!outcome.ok) {
      stop(outcome.breach);
      return;
    }
    const { lines, sized } = outcome.value;
    if (lines.every(({ change }) => change === 0)) {
      redraw(planned, 'asked');
      say(bench.shown.size === 0 ? '' : text.right);
    } else {
      redraw(sized, 'corrected');
      say(summary(outcome.value, planned), todoTable(outcome.value, bench, data));
    }
  };
  form.addEventListener('input', answer);
  form.addEventListener('submit', (event) => event.preventDefault());

  return (sized) => {
    planned = sized;
    for (const id of ['correction-combined', 'correction-dissolved']) {
      (part(id) as HTMLInputElement).checked = false;
    }
    say('');
    part('correction').hidden = sized === null;
    fields = sized && benchFields(sized, data);
  };
}

function summary({ sized }: Correction, planned: Sized): string {
  const more = 100 * (sized.weighed.massOfFats / planned.weighed.massOfFats - 1);
  return more > 0 ? text.grown(expectedMass(sized.total), more) : text.sameSize;
}

function todoTable(
  { lines }: Correction,
  { shown, dissolved }: AtTheBench,
  { lines: names }: AnySizeData,
): HTMLElement {
  const { tick, what, target, todo, by, checked } = text.columns;
  const nameOf = ({ group, id }: Pick<NamedLine, 'group' | 'id'>) =>
    names.find((line) => line.group === group && line.id === id)?.name ?? id;
  return element(
    'table',
    { class: 'todo' },
    element(
      'thead',
      {},
      element(
        'tr',
        {},
        ...[tick, what, target, todo, by, checked].map((name) =>
          element('th', { scope: 'col' }, name),
        ),
      ),
    ),
    element(
      'tbody',
      {},
      ...lines.map((corrected, place) => {
        const { line, change, step } = corrected;
        const name = nameOf(line);
        const sentence = todoText(corrected, { shown: shown.has(place), dissolved });
        return element(
          'tr',
          { class: change === 0 ? 'kept' : null },
          element('td', { class: 'tick' }),
          element('th', { scope: 'row' }, name),
          element('td', { class: 'n' }, weighed(line.mass, step)),
          element('td', {}, change === 0 ? sentence : element('b', {}, sentence)),
          element('td', { class: 'write' }),
          element('td', { class: 'write' }),
        );
      }),
    ),
  );
}
