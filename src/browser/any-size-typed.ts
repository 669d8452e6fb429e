import { OUNCE, POUND } from '../words/units.ts';
import type { Voice } from '../words/voice.ts';

/** What a field holds: a number, or why it is none. */
export type Typed =
  | { readonly ok: true; readonly value: number }
  | { readonly ok: false; readonly fault: TypedFault };

export type TypedFault =
  | 'empty'
  | 'other-sign'
  | 'not-a-number'
  | 'not-whole'
  | 'zero'
  | 'ounces'
  | 'too-long';

/** More digits than this before the sign are a slip; a tonne in grams has seven. */
const MOST_DIGITS = 7;

/**
 * A mass as it is typed, in the units of the shop: grams, or ounces with or without pounds before them (`2 lb 3.5`).
 * Digits, and decimals after the sign of the shop's locale. Nothing else is guessed at, as a comma that was meant
 * otherwise makes a thousandfold batch. The value is in grams.
 */
export function typedMass(text: string, { decimalSign, units }: Voice): Typed {
  if (units === 'metric') return typedNumber(text, decimalSign);
  const [, pounds, ounces = ''] = /^(?:(\d+)\s*lb)?\s*(.*?)\s*(?:oz)?$/su.exec(text.trim()) ?? [];
  const nothing = ounces === '' || /^0+(?:[.,]0+)?$/.test(ounces);
  const left = pounds !== undefined && nothing ? NO_OUNCES : typedNumber(ounces, decimalSign);
  if (!left.ok) return left;
  if ((pounds ?? '').length > MOST_DIGITS) return { ok: false, fault: 'too-long' };
  if (pounds !== undefined && left.value >= 16) return { ok: false, fault: 'ounces' };
  const mass = Number(pounds ?? 0) * POUND + left.value * OUNCE;
  return mass > 0 ? { ok: true, value: mass } : { ok: false, fault: 'zero' };
}

const NO_OUNCES = { ok: true, value: 0 } as const;

function typedNumber(text: string, decimalSign: string): Typed {
  const trimmed = text.trim();
  if (trimmed === '') return { ok: false, fault: 'empty' };
  const [whole = '', decimals, ...more] = trimmed.split(decimalSign);
  const isNumber = isDigits(whole) && more.length === 0 && (decimals ?? '0') !== '';
  if (!isNumber || !isDigits(decimals ?? '0')) {
    const grouped = /^\d+([.,'\u2019\s]\d+)+$/u.test(trimmed);
    return { ok: false, fault: grouped ? 'other-sign' : 'not-a-number' };
  }
  if (whole.length > MOST_DIGITS) return { ok: false, fault: 'too-long' };
  const value = Number(`${whole}.${decimals ?? 0}`);
  return value > 0 ? { ok: true, value } : { ok: false, fault: 'zero' };
}

/** A count as it is typed: digits only. */
export function typedCount(text: string): Typed {
  const trimmed = text.trim();
  if (trimmed === '') return { ok: false, fault: 'empty' };
  if (/^\d+[.,]\d*$/.test(trimmed)) return { ok: false, fault: 'not-whole' };
  if (!isDigits(trimmed)) return { ok: false, fault: 'not-a-number' };
  if (trimmed.length > MOST_DIGITS) return { ok: false, fault: 'too-long' };
  const value = Number(trimmed);
  return value > 0 ? { ok: true, value } : { ok: false, fault: 'zero' };
}

const isDigits = (text: string) => /^[0-9]+$/.test(text);
