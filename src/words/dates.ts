import { voice } from './voice.ts';

/** A calendar date as the shop's locale writes it: `2026-12-01` -> `1 Dec 2026`. Data keep the ISO form. */
export const dateText = (iso: string): string => written(iso, { dateStyle: 'medium' });

/** The month of a calendar date: `2026-12-01` -> `Dec 2026`. */
export const monthText = (iso: string): string => written(iso, { year: 'numeric', month: 'short' });

function written(iso: string, style: Intl.DateTimeFormatOptions): string {
  const { locale } = voice();
  const name = JSON.stringify([locale, style]);
  const format =
    formats.get(name) ?? new Intl.DateTimeFormat(locale, { ...style, timeZone: 'UTC' });
  formats.set(name, format);
  return format.format(new Date(`${iso}T00:00:00Z`));
}

/** To make one takes a hundred times as long as to write a date with it. */
const formats = new Map<string, Intl.DateTimeFormat>();
