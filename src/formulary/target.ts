import { celsiusOf } from '../words/units.ts';
import type { Formula } from './formula.ts';

export type Target = Formula['targets'][string];

const TEMPERATURE = {
  of: 'temperature',
  low: -5,
  high: 120,
  range: '-5 to 120 C (23 to 248 F)',
} as const;

/** What a target is of, and its sane range in degrees Celsius or hours. */
export const TARGETS = {
  fats: TEMPERATURE,
  lye: TEMPERATURE,
  combine: TEMPERATURE,
  cook: { of: 'time', low: 1 / 12, high: 48, range: '5 min to 48 h' },
  unmould: { of: 'time', low: 1 / 4, high: 21 * 24, range: '15 min to 21 d' },
  cure: { of: 'time', low: 0, high: 1100 * 24, range: '0 to 1100 d' },
} as const;
export type TargetName = keyof typeof TARGETS;

const HOURS = { h: 1, d: 24, min: 1 / 60 } as const;
const FORM = /^(-?\d+(?:\.\d+)?)(?: ?[-–] ?(-?\d+(?:\.\d+)?))? ?(°?[CF]|h|d|min)$/;

/** `38 C`, `35-40 C`, `100 F` (kept in degrees Celsius), `24 h`, `42 d`, `90 min`; `null` for anything else. */
export function parseTarget(text: string): Target | null {
  const match = FORM.exec(text.trim());
  if (!match) return null;
  const [, first, second, unit] = match;
  const scale = unit?.replace('°', '');
  const value = (digits = '') => (scale === 'F' ? celsiusOf(Number(digits)) : Number(digits));
  return {
    min: value(first),
    max: value(second ?? first),
    unit: (scale === 'F' ? 'C' : scale) as Target['unit'],
  };
}

/** Whether the unit is one for this target. */
export function suits(name: TargetName, { unit }: Target): boolean {
  return (TARGETS[name].of === 'temperature') === (unit === 'C');
}

/** Whether the target lies in its sane range, its lower end first. */
export function isSane(name: TargetName, { min, max, unit }: Target): boolean {
  const { low, high } = TARGETS[name];
  const factor = unit === 'C' ? 1 : HOURS[unit];
  return min <= max && min * factor >= low && max * factor <= high;
}
