import { wellFormed } from '../well-formed.ts';
import { dateOf, dayOf, type FinderData, type Property, type Trait } from './finder-data.ts';
import { pageTypeOf } from './page-types.ts';
import {
  type Choice,
  type FinderState,
  NO_CHOICE,
  NOTHING_ASKED,
  type Range,
  withChoice,
  withRange,
} from './state.ts';

/** A state read from an address, and the parts that say nothing this handbook knows. */
export interface ReadAddress {
  readonly state: FinderState;
  readonly ignored: readonly string[];
}

const LONGEST = 20_000;

/**
 * Reads `words=olive&where=formulas&superfat=4..6&fats=shea,!palm&fats-only=olive,shea&columns=superfat&sort=-superfat`, with or
 * without a `#` before it. Never throws: what cannot be understood is handed back.
 */
export function readAddress(address: string, data: FinderData): ReadAddress {
  let state = NOTHING_ASKED;
  const ignored: string[] = [];
  const parts = address.slice(0, LONGEST).replace(/^#/, '').split('&');
  for (const part of parts.filter((each) => each !== '')) {
    const [key = '', ...rest] = part.split('=');
    const next = readPart(state, decoded(key), rest.join('='), data);
    if (next) state = next;
    else ignored.push(decoded(part));
  }
  return { state, ignored };
}

/** The address of a state, without a `#`; `readAddress` gives the same state back. */
export function writeAddress(state: FinderState, data: FinderData): string {
  const parts: string[] = [];
  const add = (key: string, values: readonly string[]) => {
    if (values.length > 0) parts.push(`${key}=${values.map(encodeURIComponent).join(',')}`);
  };
  if (state.words !== '') add('words', [wellFormed(state.words)]);
  if (state.where) add('where', [state.where]);
  for (const property of data.properties) {
    const range = state.ranges[property.id];
    if (range) parts.push(`${property.id}=${rangeText(range, property)}`);
  }
  for (const { id } of data.traits) {
    const choice = state.choices[id] ?? NO_CHOICE;
    add(id, [...choice.with, ...choice.without.map((each) => `!${each}`)]);
    add(`${id}-only`, choice.only);
  }
  if (state.columns) parts.push(`columns=${state.columns.join(',')}`);
  if (state.sort) parts.push(`sort=${state.sort.descending ? '-' : ''}${state.sort.by}`);
  return parts.join('&');
}

function readPart(
  state: FinderState,
  key: string,
  raw: string,
  data: FinderData,
): FinderState | null {
  const values = raw.split(',').map(decoded);
  const isProperty = (id: string) => data.properties.some((property) => property.id === id);
  if (key === 'words') return { ...state, words: decoded(raw) };
  if (key === 'where') {
    const where = pageTypeOf(raw);
    return where && { ...state, where };
  }
  if (key === 'columns') {
    const known = [...new Set(values)].filter((id) => id !== '');
    return known.every(isProperty) ? { ...state, columns: known } : null;
  }
  if (key === 'sort') {
    const by = raw.replace(/^-/, '');
    if (!isProperty(by) && by !== 'code' && by !== 'name') return null;
    return { ...state, sort: { by, descending: raw.startsWith('-') } };
  }
  const property = data.properties.find(({ id }) => id === key);
  if (property) {
    const range = readRange(decoded(raw), property);
    return range && withRange(state, key, range);
  }
  const trait = data.traits.find(({ id, only }) => id === key || (only && `${id}-only` === key));
  if (!trait) return null;
  const choice = readChoice(values, trait, key !== trait.id, state.choices[trait.id] ?? NO_CHOICE);
  return choice && withChoice(state, trait.id, choice);
}

/** `4..6`, `4..`, `..6`, or `5` for exactly that. */
function readRange(text: string, property: Property): Range | null {
  const ends = text.split('..');
  if (ends.length > 2 || text === '' || text === '..') return null;
  const [min, max] = ends.map((end) => readEnd(end, property));
  if (min === undefined || Number.isNaN(min) || Number.isNaN(max)) return null;
  return { min, max: max === undefined ? min : max };
}

/** `null` where the end is open, `NaN` where it says nothing. */
function readEnd(text: string, { format }: Property): number | null {
  if (text === '') return null;
  if (format === 'date') return dayOf(text) ?? Number.NaN;
  return /^-?\d{1,12}(\.\d{1,12})?$/.test(text) ? Number(text) : Number.NaN;
}

/** `4..6` as it stands in an address. */
function rangeText({ min, max }: Range, { format }: Property): string {
  const end = (value: number | null) =>
    value === null ? '' : format === 'date' ? dateOf(value) : String(value);
  return min === max ? end(min) : `${end(min)}..${end(max)}`;
}

function readChoice(
  values: readonly string[],
  trait: Trait,
  only: boolean,
  before: Choice,
): Choice | null {
  const known = new Set(trait.choices.map(({ id }) => id));
  const unique = [...new Set(values)];
  if (unique.some((value) => !known.has(value.replace(/^!/, '')))) return null;
  if (only)
    return unique.some((value) => value.startsWith('!')) ? null : { ...before, only: unique };
  const without = unique.filter((value) => value.startsWith('!')).map((value) => value.slice(1));
  return { ...before, with: unique.filter((value) => !value.startsWith('!')), without };
}

function decoded(text: string): string {
  try {
    return decodeURIComponent(text);
  } catch {
    return text;
  }
}
