import fc from 'fast-check';
import { test } from 'vitest';
import { readFormula } from '../../src/formulary/read-formula.ts';
import { KNOWN, SOUND } from './known.ts';

/** Pieces that mean something in YAML or Markdown, put where they do not belong. */
const PIECES = [
  '\t',
  '\n',
  '---\n',
  ':',
  '{',
  '}',
  '[',
  '- ',
  '*a',
  '&a ',
  '!!x ',
  '"',
  '|',
  '<',
  '![',
  '0x',
  '.nan',
  '#',
  '\0',
  '%',
];

test('a damaged file is told about or read whole, and never stops the reader', () => {
  fc.assert(
    fc.property(
      fc.nat(SOUND.length),
      fc.nat(40),
      fc.array(fc.constantFrom(...PIECES), { maxLength: 3 }),
      (from, length, pieces) => {
        const text = SOUND.slice(0, from) + pieces.join('') + SOUND.slice(from + length);
        const { formula, problems } = readFormula(text, 'a.md', KNOWN);
        if (problems.length > 0) return formula === null && problems.every(isPlacedIn(text));
        const sum = formula?.fats.reduce((total, { share }) => total + share, 0) ?? 0;
        return Math.abs(sum - 100) <= 1e-6;
      },
    ),
    { numRuns: 300 },
  );
});

function isPlacedIn(text: string) {
  const lines = text.split('\n').length;
  return ({ line, column }: { line: number; column: number }) =>
    line >= 1 && line <= lines + 1 && column >= 1;
}
