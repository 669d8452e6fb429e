import { dateOf, dayOf, type FinderData, type Property } from '../search/finder/finder-data.ts';
import { pageTypeOf } from '../search/finder/page-types.ts';
import {
  type Choice,
  type FinderState,
  NO_CHOICE,
  withChoice,
  withRange,
} from '../search/finder/state.ts';

/** The inputs of the form, looked up once. */
export interface Fields {
  readonly words: HTMLInputElement | null;
  readonly where: HTMLSelectElement | null;
  readonly properties: readonly {
    readonly property: Property;
    readonly min: HTMLInputElement;
    readonly max: HTMLInputElement;
    readonly column: HTMLInputElement;
  }[];
  readonly traits: readonly {
    readonly id: string;
    readonly inputs: readonly HTMLInputElement[];
  }[];
  /** The folded parts, each with the ids of what can be asked in it. */
  readonly folds: readonly { readonly fold: Element; readonly ids: readonly string[] }[];
}

export function fieldsOf(form: HTMLElement, data: FinderData): Fields {
  const one = (selector: string) => form.querySelector<HTMLInputElement>(selector);
  return {
    words: one('[data-field="words"]'),
    where: form.querySelector('select'),
    properties: data.properties.flatMap((property) => {
      const within = `[data-property="${property.id}"]`;
      const min = one(`${within} [data-end="min"]`);
      const max = one(`${within} [data-end="max"]`);
      const column = one(`${within} [data-column]`);
      return min && max && column ? [{ property, min, max, column }] : [];
    }),
    traits: data.traits.map(({ id }) => ({
      id,
      inputs: [...form.querySelectorAll<HTMLInputElement>(`[data-trait="${id}"] [data-mode]`)],
    })),
    folds: [...form.querySelectorAll('details')].map((fold) => {
      const parts = [fold, ...fold.querySelectorAll<HTMLElement>('[data-property], [data-trait]')];
      const ids = parts.map(({ dataset }) => dataset.property ?? dataset.trait ?? '');
      return { fold, ids };
    }),
  };
}

/** The state that the fields say, on top of what no field says. */
export function readFields(fields: Fields, before: FinderState): FinderState {
  let state: FinderState = {
    ...before,
    words: fields.words?.value ?? '',
    where: pageTypeOf(fields.where?.value ?? ''),
  };
  for (const { property, min, max } of fields.properties) {
    state = withRange(state, property.id, {
      min: numberIn(min, property),
      max: numberIn(max, property),
    });
  }
  for (const { id, inputs } of fields.traits) {
    // a choice that no formula has stands in an address but has no field
    if (inputs.length === 0) continue;
    const offered = new Set(inputs.map(({ value }) => value));
    const asked = before.choices[id] ?? NO_CHOICE;
    const picked = (mode: keyof Choice) => [
      ...asked[mode].filter((each) => !offered.has(each)),
      ...inputs
        .filter(({ checked, dataset }) => checked && dataset.mode === mode)
        .map(({ value }) => value),
    ];
    state = withChoice(state, id, {
      with: picked('with'),
      without: picked('without'),
      only: picked('only'),
    });
  }
  return state;
}

/** Makes the fields say a state. A field that is being typed in is left alone where it means the same. */
export function fillFields(fields: Fields, state: FinderState, columns: ReadonlySet<string>): void {
  if (fields.words && fields.words.value !== state.words) fields.words.value = state.words;
  // a choice that is set anew, though the same, costs as much as a change
  const where = state.where ?? '';
  if (fields.where && fields.where.value !== where) fields.where.value = where;
  for (const { property, min, max, column } of fields.properties) {
    const range = state.ranges[property.id];
    fill(min, range?.min ?? null, property);
    fill(max, range?.max ?? null, property);
    column.checked = columns.has(property.id);
  }
  for (const { id, inputs } of fields.traits) {
    const choice = state.choices[id] ?? NO_CHOICE;
    for (const field of inputs) {
      field.checked = choice[field.dataset.mode as keyof Choice].includes(field.value);
    }
  }
  for (const { fold, ids } of fields.folds) {
    const asked = ids.some(
      (id) => state.ranges[id] !== undefined || state.choices[id] !== undefined,
    );
    fold.toggleAttribute('data-asked', asked);
  }
}

function fill(field: HTMLInputElement, value: number | null, property: Property): void {
  const same = numberIn(field, property) === value;
  if (same && (value !== null || document.activeElement === field || field.value === '')) return;
  field.value = value === null ? '' : property.format === 'date' ? dateOf(value) : String(value);
}

function numberIn({ value }: HTMLInputElement, { format }: Property): number | null {
  if (format === 'date') return dayOf(value);
  const number = Number(value);
  return value.trim() === '' || !Number.isFinite(number) ? null : number;
}
