import { readFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import postcss, { type AtRule, type Rule } from 'postcss';
import { describe, expect, test } from 'vitest';
import { contrast } from '../support/contrast.ts';

const file = fileURLToPath(new URL('../../src/site/styles/tokens.css', import.meta.url));

/** The colours of each theme by name; the dark one lies over the light one. */
function themes(): Readonly<Record<'light' | 'dark', Readonly<Record<string, string>>>> {
  const colours = { light: {}, dark: {} } as Record<'light' | 'dark', Record<string, string>>;
  postcss.parse(readFileSync(file, 'utf8')).walkDecls(/^--/, ({ prop, value, parent }) => {
    if (!/^#[0-9a-f]{6}$/.test(value)) return;
    const around = (parent as Rule).parent as AtRule;
    const isDark = around.type === 'atrule' && around.params === '(prefers-color-scheme: dark)';
    if (!isDark) colours.light[prop] = value;
    colours.dark[prop] = value;
  });
  return colours;
}

const { light, dark } = themes();

/** Text on grounds, and graphics on grounds, as the styles pair them. */
const GROUNDS = ['--paper', '--paper-raised', '--wash'];
const TEXT = [
  ...['--ink', '--ink-soft', '--link', '--danger'].flatMap((ink) =>
    GROUNDS.map((ground) => [ink, ground] as const),
  ),
  ['--ink', '--danger-wash'],
  ['--danger', '--danger-wash'],
  ['--paper', '--ink'],
  ['--paper', '--danger'],
] as const;
const GRAPHICS = [
  ...GROUNDS.map((ground) => ['--rule-strong', ground] as const),
  // the middle of a bar of three parts stands between both
  ['--ink-mid', '--paper'],
  ['--ink-mid', '--ink'],
] as const;

/** Lines between rows and a ground that is tinted: they help the eye and say nothing by themselves. */
const SAYS_NOTHING = ['--rule', '--wash', '--danger-wash'];

test('the ratio is that of the standard, by its own examples', () => {
  expect(contrast('#000000', '#ffffff')).toBeCloseTo(21, 10);
  expect(contrast('#777777', '#ffffff')).toBeCloseTo(4.48, 2);
  expect(contrast('#767676', '#ffffff')).toBeCloseTo(4.54, 2);
});

describe.each([
  ['light', light],
  ['dark', dark],
] as const)('in the %s theme', (_, colours) => {
  const ratio = (one: string, other: string) => contrast(colours[one] ?? '', colours[other] ?? '');

  test.each(TEXT)('text of %s on %s', (ink, ground) => {
    expect(ratio(ink, ground)).toBeGreaterThanOrEqual(4.5);
  });

  test.each(GRAPHICS)('graphics of %s on %s', (ink, ground) => {
    expect(ratio(ink, ground)).toBeGreaterThanOrEqual(3);
  });
});

test('every colour has its pair, and both themes have all of them', () => {
  const paired = new Set<string>([...TEXT.flat(), ...GRAPHICS.flat(), ...SAYS_NOTHING]);
  expect(Object.keys(light).filter((name) => !paired.has(name))).toEqual([]);
  expect(Object.keys(dark).sort()).toEqual(Object.keys(light).sort());
});
