import type { Report } from '../report.ts';
import type { Frontmatter } from '../schema.ts';

/** How far a sum of percentages may be from 100: room for binary fractions, not for a slip. */
const TOLERANCE = 1e-6;

/** The shares of the fats sum to 100, and so do those of the alkalis. */
export function checkShares({ fats, alkali }: Partial<Frontmatter>, report: Report): void {
  if (fats)
    checkSum(
      'fats',
      fats.map(({ share }) => share),
      report,
    );
  if (alkali) {
    const { sodium = 0, potassium = 0, basis } = alkali;
    if (sodium === 0 && potassium === 0) {
      report.in(['alkali'], 'formula/no-alkali', {
        found: 'no share of sodium or potassium',
        expected: 'shares that sum to 100',
        advice: 'write { sodium: 100 }, { potassium: 100 } or both with their basis',
      });
      return;
    }
    checkSum('alkali', [sodium, potassium], report);
    const mixed = sodium > 0 && potassium > 0;
    if (mixed && !basis) {
      report.in(['alkali'], 'formula/mixed-without-basis', {
        found: `sodium ${sodium} and potassium ${potassium} without a basis`,
        expected: 'basis: moles or basis: mass',
        advice: 'say whether the shares are of the hydroxide by amount or by pure mass',
      });
    } else if (!mixed && basis) {
      report.in(['alkali', 'basis'], 'formula/basis-without-mixed', {
        found: `basis ${basis} with one alkali`,
        expected: 'a basis only where sodium and potassium are mixed',
        advice: 'take it out, or give both shares',
      });
    }
  }
}

function checkSum(key: 'fats' | 'alkali', shares: readonly number[], report: Report) {
  const sum = shares.reduce((total, share) => total + share, 0);
  if (Math.abs(sum - 100) <= TOLERANCE) return;
  report.in([key], 'formula/shares-sum', {
    found: `shares of ${key} that sum to ${plain(sum)}`,
    expected: '100',
    advice: sum < 100 ? `add ${plain(100 - sum)}` : `take off ${plain(sum - 100)}`,
  });
}

/** Enough digits to see what is wrong, none that only binary arithmetic put there. */
const plain = (value: number) => String(Number(value.toPrecision(9)));
