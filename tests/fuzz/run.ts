import { type Chance, chance } from '../support/chance.ts';

/** Set by `npm run fuzz`; without it a few cases keep the tests quick. */
export const IS_LONG = process.env.FUZZ === 'long';

/** What was tried and all that is wrong with what came of it. */
export interface Case {
  readonly faults: readonly string[];
  readonly input: string;
}

/** The chance of one case, so that a case that fails can be run by itself. */
export function chanceOf(seed: number, index: number): Chance {
  const random = chance(Math.imul(seed, 0x9e3779b1) ^ Math.imul(index + 1, 0x85ebca6b));
  for (let i = 0; i < 8; i++) random.below(2);
  return random;
}

/** Stops at the first case with a fault and says which it was. */
export function runCases(seed: number, count: number, run: (random: Chance) => Case): void {
  for (let index = 0; index < count; index++) {
    const { faults, input } = attempt(() => run(chanceOf(seed, index)));
    if (faults.length > 0) {
      throw new Error(`seed ${seed}, case ${index}:\n${faults.slice(0, 5).join('\n')}\n\n${input}`);
    }
  }
}

/** One case; what it throws is its fault. */
export function attempt(run: () => Case): Case {
  try {
    return run();
  } catch (error) {
    const said = error instanceof Error ? (error.stack ?? error.message) : String(error);
    return { faults: [said], input: '' };
  }
}
