import type { Formula } from './formula.ts';
import type { Target } from './target.ts';

/** Days counted from the day of making, which is day 0. `null` where the formula states no such target. */
export interface Schedule {
  /** First day on which a bar may be taken out of its mould and cut. */
  readonly cutFromDay: number | null;
  /** First day on which it may be tested for release. */
  readonly releaseFromDay: number | null;
}

const HOURS: Readonly<Record<Target['unit'], number>> = { d: 24, h: 1, min: 1 / 60, C: Number.NaN };

/**
 * The earliest days that the lower ends of the targets `unmould` and `cure` allow. Both count from making;
 * a part of a day counts whole, and nothing is released before it may be cut.
 */
export function scheduleOf({ targets }: Formula): Schedule {
  const dayOf = (target: Target | undefined) =>
    target ? Math.ceil((target.min * HOURS[target.unit]) / 24) : null;
  const cut = dayOf(targets.unmould);
  const cured = dayOf(targets.cure);
  return {
    cutFromDay: cut,
    releaseFromDay: cured === null ? null : Math.max(cured, cut ?? 0),
  };
}

/** `2026-12-01` and 42 days -> `2027-01-12`. `start` must be a day of the calendar. */
export function dayAfter(start: string, days: number): string {
  const date = new Date(`${start}T00:00:00Z`);
  date.setUTCDate(date.getUTCDate() + days);
  return date.toISOString().slice(0, 10);
}
