import type { FormulaDocument } from '../formulary/document.ts';
import { dayAfter } from '../formulary/schedule.ts';
import type { Reference } from '../reference/reference.ts';
import { words } from '../words/catalogue.ts';
import { dateText } from '../words/dates.ts';
import { tableBasis } from '../words/measures.ts';
import { wetMassesOf } from './batch-yields.ts';
import { sourceName } from './names.ts';

export interface YieldRow {
  readonly name: string;
  readonly fresh: string;
  /** `null` for pastes and liquids, which are not dried. */
  readonly released: string | null;
}

/** What the basis of the table gives (1000 g of fats, or a pound), fresh and at the release moisture. */
export function yieldRows(document: FormulaDocument): readonly YieldRow[] {
  const { measures, percent } = words.yieldWords;
  const ofBasis = tableBasis() / 1000;
  const grams = (mass: number) => words.yieldWords.grams(mass * ofBasis);
  const gramsAndShare = (mass: number, share: number) =>
    words.yieldWords.gramsAndShare(mass * ofBasis, share);
  const given = document.yield;
  const dries = document.kind === 'bar';
  const part = (name: string, mass: number): YieldRow => ({
    name,
    fresh: gramsAndShare(mass, (100 * mass) / given.total),
    released: dries ? gramsAndShare(mass, (100 * mass) / given.releasedMass) : null,
  });
  const waterLeft = given.water - (given.total - given.releasedMass);
  const { totalFattyMatter } = given;
  return [
    {
      name: measures.mass,
      fresh: grams(given.total),
      released: dries ? grams(given.releasedMass) : null,
    },
    {
      name: measures.water,
      fresh: gramsAndShare(given.water, given.moisture.fresh),
      released: dries ? gramsAndShare(waterLeft, given.moisture.released) : null,
    },
    part(measures.soap, given.soap),
    part(measures.glycerol, given.glycerol),
    part(measures.unsaponified, given.unsaponifiedFat),
    {
      name: measures.totalFattyMatter,
      fresh: percent(totalFattyMatter.fresh),
      released: dries ? percent(totalFattyMatter.released) : null,
    },
  ];
}

/** What a bar of each poured weight of the shop weighs at release, in sentences. */
export function barsAtRelease(document: FormulaDocument, reference: Reference): readonly string[] {
  const { total, releasedMass } = document.yield;
  return wetMassesOf(reference).map((wetMass) =>
    words.yieldWords.barAtRelease(wetMass, (wetMass * releasedMass) / total),
  );
}

export interface GradeRow {
  readonly name: string;
  readonly least: string;
  readonly fresh: boolean;
  readonly released: boolean;
}

/** The total fatty matter of a bar beside the grades of the data; empty for pastes and liquids. */
export function gradeRows(document: FormulaDocument, reference: Reference): readonly GradeRow[] {
  if (document.kind !== 'bar') return [];
  const { fresh, released } = document.yield.totalFattyMatter;
  return reference.soapGrades.map(({ name, totalFattyMatter: { min, value } }) => {
    const least = min ?? value ?? 0;
    return {
      name,
      least: words.yieldWords.atLeast(least),
      fresh: fresh >= least,
      released: released >= least,
    };
  });
}

/** The sources of the grades with how they are known, each once. */
export function gradesLead(reference: Reference): readonly string[] {
  const leads = reference.soapGrades.map(({ totalFattyMatter: { source, how } }) =>
    words.yieldWords.gradesLead(sourceName(reference, source), words.frame.how[how]),
  );
  return [...new Set(leads)];
}

/** The rule of the days and, for one day of making, the dates; `null` where the formula states neither. */
export function scheduleLines(
  { schedule: { cutFromDay: cut, releaseFromDay: release } }: FormulaDocument,
  made: string,
): readonly [rule: string, example: string] | null {
  if (cut === null && release === null) return null;
  const on = (day: number | null) => (day === null ? null : dateText(dayAfter(made, day)));
  return [
    words.yieldWords.schedule(cut, release),
    words.yieldWords.scheduleExample(dateText(made), on(cut), on(release)),
  ];
}
