import { fixed, plain } from '../numbers.ts';

/** What the titration command prints. */
export const titrationLines = {
  value: (value: number) => `Saponification value ${fixed(value, 1)} mg KOH/g`,
  valueWithin: (value: number, uncertainty: number) =>
    `Saponification value ${fixed(value, 1)} ± ${fixed(uncertainty, 1)} mg KOH/g, k = 2`,
  equation: (normality: number, blank: number, sample: number, mass: number) =>
    `  56.1 x ${plain(normality, 4)} x (${plain(blank, 3)} - ${plain(sample, 3)}) / ${plain(mass, 4)}, the factor as the standard rounds it (ISO 3657)`,
  part: {
    volume: (half: number) => `  both volumes   ± ${fixed(half, 2)}`,
    mass: (half: number) => `  mass           ± ${fixed(half, 2)}`,
    normality: (half: number) => `  normality      ± ${fixed(half, 2)}`,
  },
  lotsLine: 'For lots.yaml, under fats; another person releases it:',
  fillIn:
    'Put the id of the fat, the number of the lot and the retest date in where capitals stand.',
  noUncertainty:
    'No line for lots.yaml: a value without its uncertainty says nothing of the margin. Give --volume-uncertainty, --mass-uncertainty and --normality-uncertainty, half-widths at k = 2; 0 only where it is negligible.',
  number: (option: string, given: string) =>
    `--${option}: "${given}" is no number. Write it like 18.95, with a point and no unit.`,
  missing: (options: readonly string[]) =>
    `${options.map((option) => `--${option}`).join(', ')} ${options.length === 1 ? 'is' : 'are'} missing.`,
  unusable:
    'These readings give no saponification value: mass and normality must be above zero, the sample not below zero, and the blank above the sample.',
  noUncertaintyBelowZero: 'An uncertainty cannot be below zero.',
  outside: (value: number, uncertainty: number) =>
    `${fixed(value, 1)} ± ${fixed(uncertainty, 1)} mg KOH/g is outside what a lot can have (60 to 400, ± at most 10). Check the readings and their units; no line for lots.yaml.`,
} as const;
