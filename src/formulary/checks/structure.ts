import type { Heading, Node, Root } from 'mdast';
import { visit } from 'unist-util-visit';
import type { Place } from '../../reference/yaml.ts';
import { isMethodHeading } from '../method-heading.ts';
import type { Report } from '../report.ts';
import { textOf } from '../text-of.ts';

/** No HTML, headings from level 2 without gaps, and a section `Method`, or that in another language, with numbered steps. */
export function checkStructure(method: Root, bodyStart: Place, report: Report): void {
  let level = 1;
  visit(method, (node) => {
    if (node.type === 'html') {
      report.at(startOf(node), 'formula/raw-html', {
        found: `HTML, ${node.value.split('\n')[0]?.slice(0, 40)}`,
        expected: 'Markdown',
        advice: 'say it in Markdown; write a plain "<" as \\<',
      });
    } else if (node.type === 'heading') {
      if (node.depth === 1 || node.depth > level + 1) {
        report.at(startOf(node), 'formula/heading-level', {
          found: `a heading of level ${node.depth}`,
          expected: level === 1 ? 'level 2' : `level 2 to ${Math.min(6, level + 1)}`,
          advice: 'level 1 is the name of the formula, and no level is left out',
        });
      }
      level = Math.max(2, node.depth);
    }
  });

  const start = method.children.findIndex(isMethod);
  const heading = method.children[start];
  if (!heading) {
    report.at(bodyStart, 'formula/no-method', {
      found: 'no section "Method"',
      expected: 'a heading "## Method" with numbered steps below it',
    });
    return;
  }
  const rest = method.children.slice(start + 1);
  const end = rest.findIndex((node) => node.type === 'heading' && node.depth <= 2);
  const section = end === -1 ? rest : rest.slice(0, end);
  const hasSteps = section.some((node) => node.type === 'list' && node.ordered === true);
  if (!hasSteps) {
    report.at(startOf(heading), 'formula/method-without-steps', {
      found: 'a section "Method" without numbered steps',
      expected: 'steps as "1. Weigh ..."',
    });
  }
}

const isMethod = (node: Node): boolean =>
  node.type === 'heading' && (node as Heading).depth === 2 && isMethodHeading(textOf(node));

/** Where a node begins; every node of a parsed file has a place. */
export const startOf = ({ position }: Node): Place => ({
  line: position?.start.line ?? 1,
  column: position?.start.column ?? 1,
});
