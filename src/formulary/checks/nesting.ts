import type { Place } from '../../reference/yaml.ts';
import type { Report } from '../report.ts';

/** Blanks and marks at the beginning of a line before anything is said. No formula needs as many. */
const DEEP = /^(?:[ \t>]|[-+*] |\d+[.)] ){60}/;

/** Opens a block that formulas do not have; each one inside the last doubles the reader's work. */
const BLOCK = /^ {0,3}:::/;
const MOST_BLOCKS = 20;

/**
 * Whether the text can be read as Markdown at all: lists in lists without end would take the reader hours,
 * or the whole of its stack.
 */
export function isShallow(body: string, bodyPlace: Place, report: Report): boolean {
  let blocks = 0;
  const index = body.split('\n').findIndex((line, i) => {
    if (i < bodyPlace.line - 1) return false;
    if (BLOCK.test(line)) blocks += 1;
    return DEEP.test(line) || blocks > MOST_BLOCKS;
  });
  if (index === -1) return true;
  report.at({ line: index + 1, column: 1 }, 'formula/nesting', {
    found:
      blocks > MOST_BLOCKS ? 'blocks inside blocks' : 'a line that begins 60 blanks or marks deep',
    expected: 'lists and quotations a few levels deep',
    advice: 'begin the line further left and leave blocks out',
  });
  return false;
}
