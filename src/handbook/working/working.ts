import type { ComputedFormula } from '../../formulary/formulary.ts';
import type { Reference } from '../../reference/reference.ts';
import { acids, hydroxide } from './acids.ts';
import { alkali } from './alkali.ts';
import { batches } from './batches.ts';
import { check } from './check.ts';
import { workingOf } from './context.ts';
import { equivalents, liquids } from './equivalents.ts';
import { heat } from './heat.ts';
import { margin } from './margin.ts';
import { molarMasses } from './molar-masses.ts';
import type { Section } from './step.ts';
import { water } from './water.ts';
import { profile, yieldSection } from './yield.ts';

/**
 * The working of one formula: every equation with its numbers, in the order of a check by hand. Throws a
 * RangeError where the printed numbers do not give the printed result.
 */
export function workingSections(
  computed: ComputedFormula,
  reference: Reference,
): readonly Section[] {
  const working = workingOf(computed, reference);
  const sections = [
    molarMasses(working),
    liquids(working),
    equivalents(working),
    acids(working),
    hydroxide(working),
    alkali(working),
    water(working),
    check(working),
    margin(working),
    heat(working),
    profile(working),
    yieldSection(working),
    ...batches(working),
  ];
  return sections.filter((section) => section !== null);
}
