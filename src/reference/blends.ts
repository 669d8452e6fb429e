import { whatIsWrongWith } from './ids.ts';
import type { KnownFats } from './materials.ts';
import { didYouMean } from './nearest.ts';
import type { DataReport } from './report.ts';
import type { RawBlends } from './schema/blends.ts';
import type { Blend } from './shop-records.ts';

/** How far the shares of a blend may sum from 100: room for binary fractions, not for a slip. */
const TOLERANCE = 1e-6;

/**
 * The blends that the shop keeps ready, each from fats that can be computed with. `taken` are the ids of
 * everything else that is weighed: one id on a sheet means one thing.
 */
export function blendsFrom(
  raw: RawBlends,
  { fats, fatIds }: KnownFats,
  taken: ReadonlySet<string>,
  report: DataReport,
): Map<string, Blend> {
  const blends = new Map<string, Blend>();
  for (const [id, { name, parts, notes = [] }] of Object.entries(raw)) {
    const expected = whatIsWrongWith(id);
    if (expected !== null) {
      report.inKey([id], 'data/text-form', {
        found: `the id "${id}"`,
        expected,
        advice: 'the name may be anything',
      });
    }
    if (taken.has(id)) {
      report.inKey([id], 'data/blend-id', {
        found: `the id "${id}", which is also that of another material`,
        expected: 'an id of its own',
        advice: 'name the blend for what it is used for',
      });
    }
    parts.forEach(({ fat }, index) => {
      const path = [id, 'parts', index, 'fat'];
      if (!fatIds.has(fat)) {
        report.in(path, 'data/unknown-fat', {
          found: `fat "${fat}"`,
          expected: 'an id from data/fats',
          advice: didYouMean(fat, fatIds, 'add a file for it first'),
        });
      } else if (fats.has(fat) && !fats.get(fat)?.core) {
        report.in(path, 'data/blend-part', {
          found: `fat "${fat}", for which the data give no saponification value with a range`,
          expected: 'a fat with one',
          advice: 'add a sourced range to its data file',
        });
      }
      if (parts.findIndex((part) => part.fat === fat) !== index) {
        report.in(path, 'data/repeated-entry', {
          found: `a second "${fat}"`,
          expected: 'each fat once',
          advice: 'add the two shares together',
        });
      }
    });
    const sum = parts.reduce((total, { share }) => total + share, 0);
    if (Math.abs(sum - 100) > TOLERANCE) {
      report.in([id, 'parts'], 'data/blend-sum', {
        found: `shares that sum to ${Number(sum.toPrecision(9))}`,
        expected: '100',
        advice: 'state each part as percent by mass of the blend',
      });
    }
    blends.set(id, { id, name, parts, notes });
  }
  return blends;
}
