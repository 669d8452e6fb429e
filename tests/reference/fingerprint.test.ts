import { expect, test } from 'vitest';
import { parseYaml } from '../../src/reference/yaml.ts';
import { PACKAGED, packagedReference } from './packaged-data.ts';

// Row counts and column sums were taken from the tables as collected, not from these files: a digit that
// slipped in copying moves a sum. An absent end counts as 0.

const { fats } = packagedReference();
const round = (x: number) => Math.round(x * 1000) / 1000;

function values(
  source: string,
  key: 'saponificationValues' | 'iodineValues' | 'unsaponifiableMatter',
) {
  const rows = [...fats.values()].flatMap((fat) => fat[key]).filter((row) => row.source === source);
  return [
    rows.length,
    round(rows.reduce((sum, { value, min }) => sum + (value ?? min ?? 0), 0)),
    round(rows.reduce((sum, { value, max }) => sum + (value ?? max ?? 0), 0)),
  ];
}

test.each([
  ['cxs-210-1999', [25, 4822, 5125], [25, 2103.4, 2538.6]],
  ['cxs-211-1999', [4, 764, 808], [4, 191, 237]],
  ['cxs-33-1981', [2, 366, 389], [2, 150, 186]],
  ['simmons-appleton-1908', [16, 3194.8, 3213.7], [13, 968.8, 1019.4]],
  ['agmark', [6, 1121, 1179], [6, 524, 635]],
  ['merck-index', [6, 1019.2, 1061.2], [6, 541.7, 619.7]],
])('%s: saponification and iodine values: rows, sums of lower and upper ends', (source, sv, iv) => {
  expect(values(source, 'saponificationValues')).toEqual(sv);
  expect(values(source, 'iodineValues')).toEqual(iv);
});

test('unsaponifiable matter of the Codex tables', () => {
  const rows = [...fats.values()].flatMap(({ unsaponifiableMatter }) => unsaponifiableMatter);
  const sum = (source: string) =>
    rows.filter((row) => row.source === source).reduce((total, { max }) => total + (max ?? 0), 0);
  expect([sum('cxs-210-1999'), sum('cxs-211-1999'), sum('cxs-33-1981')]).toEqual([458, 44, 45]);
});

test.each([
  ['cxs-210-1999', 21, 295, 1609.1, 2671.36],
  ['cxs-211-1999', 2, 31, 140.2, 264.6],
  ['cxs-33-1981', 2, 26, 133.6, 271.2],
  ['cxs-325r-2017', 1, 9, 60, 139.5],
  ['nutrients-2019-2008', 3, 40, 247.9, 365.3],
  ['molecules-2019-4235', 1, 15, 72.2, 141.9],
  ['ijms-2015-12874', 6, 54, 605.9, 605.9],
  ['pmc9083541', 4, 23, 329.5, 414.9],
])(
  '%s: compositions: fats, rows, sums of lower and upper ends',
  (source, count, rows, min, max) => {
    const compositions = [...fats.values()]
      .flatMap((fat) => fat.compositions)
      .filter((composition) => composition.source === source);
    const acids = compositions.flatMap((composition) => composition.acids);
    expect(compositions).toHaveLength(count);
    expect(acids).toHaveLength(rows);
    expect(round(acids.reduce((sum, acid) => sum + (acid.min ?? 0), 0))).toBe(min);
    expect(round(acids.reduce((sum, acid) => sum + acid.max, 0))).toBe(max);
  },
);

test.each([
  ['heat-of-solution', 'felder-rousseau', 'sodium-hydroxide', 16, 68962, 654.41],
  ['density', 'crc-handbook', 'sodium-hydroxide', 20, 443, 24.775],
  ['density', 'laliberte-2009', 'sodium-hydroxide', 50, 1275, 63.642],
  ['density', 'crc-handbook', 'potassium-hydroxide', 11, 276, 13.707],
  ['density', 'laliberte-2009', 'potassium-hydroxide', 50, 1275, 62.426],
  ['heat-capacity', 'laliberte-2009', 'sodium-hydroxide', 7, 105, 26.317],
  ['heat-capacity', 'laliberte-2009', 'potassium-hydroxide', 10, 225, 32.696],
  ['solubility', 'crc-handbook', 'sodium-hydroxide', 12, 575, 706],
  ['solubility', 'crc-handbook', 'potassium-hydroxide', 12, 575, 689.6],
  ['solubility', 'older-handbooks', 'sodium-hydroxide', 9, 390, 502.5],
])('table %s, %s, %s: points and sums of both axes', (name, source, solute, count, x, y) => {
  const text = PACKAGED.find((entry) => entry.name === `tables/${name}.yaml`)?.text ?? '';
  const table = parseYaml(text).value as {
    sets: { source: string; solute: string; points?: [number, number][] }[];
  };
  const points =
    table.sets.find((set) => set.source === source && set.solute === solute)?.points ?? [];
  expect(points).toHaveLength(count);
  expect(round(points.reduce((sum, point) => sum + point[0], 0))).toBe(x);
  expect(round(points.reduce((sum, point) => sum + point[1], 0))).toBe(y);
});
