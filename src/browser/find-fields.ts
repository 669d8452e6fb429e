import { dateOf, dayOf, type FinderData } from '../search/finder/finder-data.ts';
import {
  type Choice,
  type FinderState,
  NO_CHOICE,
  withChoice,
  withRange,
} from '../search/finder/state.ts';
import { inputs } from './find-dom.ts';

/** The state that the fields say, on top of what no field says. */
export function readFields(form: HTMLElement, data: FinderData, before: FinderState): FinderState {
  let state: FinderState = { ...before, words: fieldOf(form, 'words')?.value ?? '' };
  for (const { id, format } of data.properties) {
    const within = form.querySelector(`[data-property="${id}"]`);
    if (!within) continue;
    const [min = null, max = null] = inputs(within, 'end').map(({ value }) =>
      format === 'date' ? dayOf(value) : numberOf(value),
    );
    state = withRange(state, id, { min, max });
  }
  for (const { id } of data.traits) {
    const within = form.querySelector(`[data-trait="${id}"]`);
    if (!within) continue;
    const picked = (mode: keyof Choice) =>
      inputs(within, 'mode')
        .filter(({ checked, dataset }) => checked && dataset.mode === mode)
        .map(({ value }) => value);
    state = withChoice(state, id, {
      with: picked('with'),
      without: picked('without'),
      only: picked('only'),
    });
  }
  return state;
}

/** Makes the fields say a state. A field that is being typed in is left alone when it means the same. */
export function fillFields(
  form: HTMLElement,
  data: FinderData,
  state: FinderState,
  columns: ReadonlySet<string>,
): void {
  const words = fieldOf(form, 'words');
  if (words && words.value !== state.words) words.value = state.words;
  for (const { id, format } of data.properties) {
    const within = form.querySelector(`[data-property="${id}"]`);
    if (!within) continue;
    const range = state.ranges[id];
    for (const [i, field] of inputs(within, 'end').entries()) {
      const value = (i === 0 ? range?.min : range?.max) ?? null;
      const read = format === 'date' ? dayOf(field.value) : numberOf(field.value);
      if (read === value && (value !== null || document.activeElement === field)) continue;
      field.value = value === null ? '' : format === 'date' ? dateOf(value) : String(value);
    }
    for (const field of inputs(within, 'column')) field.checked = columns.has(id);
  }
  for (const { id } of data.traits) {
    const choice = state.choices[id] ?? NO_CHOICE;
    const within = form.querySelector(`[data-trait="${id}"]`);
    for (const field of within ? inputs(within, 'mode') : []) {
      field.checked = choice[field.dataset.mode as keyof Choice].includes(field.value);
    }
  }
}

const fieldOf = (form: HTMLElement, name: string) =>
  form.querySelector<HTMLInputElement>(`input[data-field="${name}"]`);

function numberOf(text: string): number | null {
  const value = Number(text);
  return text.trim() === '' || !Number.isFinite(value) ? null : value;
}
