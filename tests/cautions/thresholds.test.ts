import { readFileSync } from 'node:fs';
import { expect, test } from 'vitest';
import { cautionThresholdsFrom, LIMIT_UNITS } from '../../src/reference/caution-thresholds.ts';
import { reportOn } from '../../src/reference/report.ts';
import { cautionsSchema } from '../../src/reference/schema/cautions.ts';
import { fit } from '../../src/reference/schema-problems.ts';
import { parseYaml } from '../../src/reference/yaml.ts';
import type { Problem } from '../../src/words/problem.ts';
import { problemText } from '../../src/words/problem-text.ts';
import { REFERENCE } from './context.ts';

const TEXT = readFileSync('data/cautions.yaml', 'utf8');

/** The problems of the file with one text in it replaced. */
function problemsWith(found: string, instead: string): readonly string[] {
  expect(TEXT).toContain(found);
  const yaml = parseYaml(TEXT.replace(found, instead));
  const problems: Problem[] = [];
  const report = reportOn('data/cautions.yaml', yaml, problems);
  const raw = fit(cautionsSchema, yaml.value, report);
  if (raw) {
    const { fats, additives, liquids, sources } = REFERENCE;
    const materials = new Set([...fats.keys(), ...additives.keys(), ...liquids.keys()]);
    cautionThresholdsFrom(raw, sources, materials, report);
  }
  return problems.map(problemText);
}

test('the file as it stands has no problem', () => {
  expect(problemsWith('ids: [castor]', 'ids: [castor]')).toEqual([]);
});

test('a limit in another unit is refused', () => {
  expect(problemsWith('unit: degC', 'unit: K')).toEqual([
    expect.stringMatching(/^data\/cautions\.yaml:\d+:11 {2}Found "K", expected degC; /),
  ]);
});

test('a limit that is not there is named, and what was meant by another', () => {
  const problems = problemsWith('  castor-share:', '  castor-shares:');
  expect(problems).toEqual([
    expect.stringContaining('Found no key "castor-share"'),
    expect.stringContaining('did you mean "castor-share"?'),
  ]);
});

test('a basis must be a source on record or common practice', () => {
  const list = 'ids: [castor]\n    basis: common practice, no source';
  expect(problemsWith(list, 'ids: [castor]\n    basis: hearsay')).toEqual([
    expect.stringMatching(
      /^data\/cautions\.yaml:\d+:12 {2}Found basis "hearsay", expected an id from data\/sources\.yaml or "common practice, no source"; .*\[data\/unknown-source\]$/,
    ),
  ]);
});

test('a material must be in the data', () => {
  expect(problemsWith('ids: [castor]', 'ids: [castro]')).toEqual([
    expect.stringContaining(
      'Found material "castro", expected the id of a fat, an additive or a liquid; did you mean "castor"?',
    ),
  ]);
});

test('limits that the trade states: castor 5 %, rapeseed 20 to 25 %, a cooker half full', () => {
  const { limits } = REFERENCE.cautionThresholds;
  expect(Object.keys(limits).sort()).toEqual(Object.keys(LIMIT_UNITS).sort());
  expect(limits['castor-share']).toMatchObject({ value: 5, unit: '% of fats' });
  expect(limits['rapeseed-share'].value).toBe(20);
  expect(limits['rapeseed-share-most'].value).toBe(25);
  expect(limits['vessel-fill-hot'].value).toBe(50);
});
