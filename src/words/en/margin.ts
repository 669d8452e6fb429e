import { fixed, plain } from '../numbers.ts';

export const marginWords = {
  written: 'written',
  expanded: 'expanded interval',
  worst: 'worst case',
  withoutLots: 'expanded interval without the measured lots, on trade ranges',
  freeAlkali: 'free alkali from here',
  summary: (
    written: number,
    expanded: readonly [number, number],
    worst: readonly [number, number],
  ) =>
    `Superfat written ${plain(written, 1)} %. Expanded interval ${fixed(expanded[0], 1)} to ${fixed(expanded[1], 1)} %. Worst case ${fixed(worst[0], 1)} to ${fixed(worst[1], 1)} %.`,
  crossesWorst:
    'The worst case reaches below zero: with every fat at the low end of its range and the alkali at its strongest, free alkali would be left.',
  crossesExpanded:
    'The expanded interval reaches below zero. Free alkali is possible in ordinary work; measure before release.',
  clear:
    'Both intervals stay above zero: no free alkali is expected from the spread of the materials.',
  method: 'How the margin is reckoned',
  scaleLeftOut: 'The scale is left out here; each batch size above counts its own.',
  budgetTitle: 'What moves it most',
  budgetUnit: 'percentage points, k = 2',
  assay: (name: string) => `${name}, assay`,
  scale: 'Scale',
} as const;
