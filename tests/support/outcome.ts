import type { Outcome } from '../../src/chemistry/quantity.ts';

/** The value of an outcome that a test expects to be given. */
export function givenValue<T>(outcome: Outcome<T>): T {
  if (!outcome.ok) throw new Error(`refused: ${JSON.stringify(outcome.breach)}`);
  return outcome.value;
}
