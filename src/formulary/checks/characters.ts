import type { Report } from '../report.ts';

/** Control characters, and the marks that make text read in another order than it is written. */
const HIDDEN = /[^\P{Cc}\t\n\r]|[\u200B\u2028\u2029\u202A-\u202E\u2066-\u2069\uFEFF]/gu;

/** A weight must not look other than it is: nothing in the file is invisible. */
export function checkCharacters(text: string, report: Report): void {
  if (text.search(HIDDEN) === -1) return;
  for (const [index, line] of text.split('\n').entries()) {
    for (const { 0: character, index: column } of line.matchAll(HIDDEN)) {
      const code = character.charCodeAt(0).toString(16).toUpperCase().padStart(4, '0');
      report.at({ line: index + 1, column: column + 1 }, 'formula/hidden-character', {
        found: `the invisible character U+${code}`,
        expected: 'text that can be seen',
        advice: 'delete it and type the text around it again',
      });
    }
  }
}
