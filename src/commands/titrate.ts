import { expandedUncertainty, type Titration, titrate } from '../chemistry/titration.ts';
import { lotsSchema } from '../reference/schema/lots.ts';
import { words } from '../words/catalogue.ts';
import { readArguments } from './arguments.ts';

const READINGS = ['blank', 'sample', 'mass', 'normality'] as const;
const UNCERTAINTIES = ['volume', 'mass', 'normality'] as const;

/** Prints the saponification value of a back titration and its line for `lots.yaml`. Reads and writes no file. */
export function main(args: readonly string[]): number {
  const read = readArguments(args, {
    command: 'titrate',
    about:
      'The saponification value of a fat from a back titration (ISO 3657), with its uncertainty.',
    options: {
      blank: { value: 'ML', about: 'acid that the blank took, in mL' },
      sample: { value: 'ML', about: 'acid that the sample took, in mL' },
      mass: { value: 'G', about: 'mass of the fat, in g' },
      normality: { value: 'N', about: 'concentration of the acid, in mol/L' },
      'volume-uncertainty': { value: 'ML', about: 'of each volume, half-width at k = 2' },
      'mass-uncertainty': { value: 'G', about: 'of the mass, half-width at k = 2' },
      'normality-uncertainty': { value: 'N', about: 'of the acid, half-width at k = 2' },
      fat: { value: 'ID', about: 'id of the fat, for the line' },
      lot: { value: 'LOT', about: 'number of the lot, for the line' },
      'retest-by': { value: 'DATE', about: 'day of the next retest, for the line' },
    },
  });
  if (!read.ok) {
    console.error(read.text);
    return read.status;
  }
  const { given } = read;
  const missing = READINGS.filter((name) => given[name] === undefined);
  if (missing.length > 0) return refuse(words.titrationLines.missing(missing));
  const numbers = new Map<string, number>();
  for (const name of [...READINGS, ...UNCERTAINTIES.map((of) => `${of}-uncertainty` as const)]) {
    const written = given[name];
    if (written === undefined) continue;
    if (!/^-?[0-9]+(\.[0-9]+)?$/.test(written))
      return refuse(words.titrationLines.number(name, written));
    numbers.set(name, Number(written));
  }
  const [blank = 0, sample = 0, mass = 0, normality = 0] = READINGS.map((name) =>
    numbers.get(name),
  );
  const stated = UNCERTAINTIES.map((of) => numbers.get(`${of}-uncertainty`));
  if (stated.some((half) => half !== undefined && half < 0)) {
    return refuse(words.titrationLines.noUncertaintyBelowZero);
  }
  const [ofVolume = 0, ofMass = 0, ofNormality = 0] = stated;
  if (!(mass > 0 && normality > 0 && sample >= 0 && blank > sample))
    return refuse(words.titrationLines.unusable);
  const reading: Titration = {
    blank,
    sample,
    mass,
    normality,
    uncertainty: { volume: ofVolume, mass: ofMass, normality: ofNormality },
  };
  const { value } = titrate(reading);
  if (stated.some((half) => half === undefined)) {
    console.log(words.titrationLines.value(value));
    console.log(words.titrationLines.equation(normality, blank, sample, mass));
    console.log(words.titrationLines.noUncertainty);
    return 0;
  }
  const { together, volume, mass: byMass, normality: byNormality } = expandedUncertainty(reading);
  const rounded = Number(value.toFixed(1));
  // up, with what rounding the value takes off, so that the printed interval holds the computed one
  const uncertainty = Math.max(
    0.1,
    Math.ceil((together + Math.abs(value - rounded)) * 10 - 1e-9) / 10,
  );
  const { fat = 'FAT', lot = 'LOT', 'retest-by': retestBy = 'DATE' } = given;
  const entry = {
    fat,
    lot,
    'saponification-value': rounded,
    uncertainty,
    method: 'ISO 3657',
    status: 'quarantine',
  };
  if (!lotsSchema.safeParse({ fats: [{ ...entry, 'retest-by': '2000-01-01' }] }).success) {
    return refuse(words.titrationLines.outside(value, uncertainty));
  }
  console.log(words.titrationLines.valueWithin(rounded, uncertainty));
  console.log(words.titrationLines.equation(normality, blank, sample, mass));
  console.log(words.titrationLines.part.volume(volume));
  console.log(words.titrationLines.part.mass(byMass));
  console.log(words.titrationLines.part.normality(byNormality));
  console.log(`\n${words.titrationLines.lotsLine}`);
  console.log(`  - ${flow({ ...entry, 'retest-by': retestBy })}`);
  if (!given.fat || !given.lot || !given['retest-by']) console.log(words.titrationLines.fillIn);
  return 0;
}

function refuse(line: string): 1 {
  console.error(line);
  return 1;
}

/** One line of YAML; a text that could be read as anything else is quoted. */
function flow(entry: Readonly<Record<string, string | number>>): string {
  const parts = Object.entries(entry).map(
    ([key, value]) => `${key}: ${isPlain(value) ? value : JSON.stringify(value)}`,
  );
  return `{ ${parts.join(', ')} }`;
}

const isPlain = (value: string | number) =>
  typeof value === 'number' ||
  (/^[A-Za-z][A-Za-z0-9 -]*$|^\d{4}-\d\d-\d\d$/.test(value) && !/^(true|false|null)$/i.test(value));
