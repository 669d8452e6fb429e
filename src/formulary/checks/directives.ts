import type { Root } from 'mdast';
import type { TextDirective } from 'mdast-util-directive';
import { visit } from 'unist-util-visit';
import { didYouMean } from '../../reference/nearest.ts';
import type { AmountNames } from '../amount-names.ts';
import type { Report } from '../report.ts';
import { textOf } from '../text-of.ts';
import { startOf } from './structure.ts';

/** The amounts that the text may ask for; `null` takes no name. */
const DIRECTIVES = {
  weight: 'weights',
  alkali: 'alkalis',
  temperature: 'temperatures',
  time: 'times',
  lye: null,
  water: null,
  'held-back': null,
} as const;

const FORMS =
  ':weight[id], :alkali[sodium], :lye, :water, :held-back, :temperature[fats] or :time[cure]';

/** Every directive in the text is an amount that this formula has. */
export function checkDirectives(method: Root, names: AmountNames | null, report: Report): void {
  visit(method, (node) => {
    if (node.type === 'textDirective') checkOne(node, names, report);
    else if (node.type === 'leafDirective' || node.type === 'containerDirective') {
      report.at(startOf(node), 'formula/unknown-directive', {
        found: `a block "::${node.name}"`,
        expected: `amounts inside a sentence: ${FORMS}`,
      });
    }
  });
}

function checkOne(node: TextDirective, names: AmountNames | null, report: Report) {
  const label = textOf(node);
  const place = startOf(node);
  const { name } = node;
  if (!Object.hasOwn(DIRECTIVES, name)) {
    report.at(place, 'formula/unknown-directive', {
      found: `":${name}"`,
      expected: FORMS,
      advice: didYouMean(
        name,
        Object.keys(DIRECTIVES),
        `if it is plain text, write "\\:${name}" or put a space after the colon`,
      ),
    });
    return;
  }
  if (Object.keys(node.attributes ?? {}).length > 0) {
    report.at(place, 'formula/unknown-directive', {
      found: `":${name}" with braces`,
      expected: FORMS,
      advice: 'take the braces out',
    });
    return;
  }
  const list = DIRECTIVES[name as keyof typeof DIRECTIVES];
  if (list === null) {
    if (label !== '') {
      report.at(place, 'formula/directive-name', {
        found: `":${name}[${label}]"`,
        expected: `":${name}" without a name`,
      });
    } else if (name === 'held-back' && names && !names.heldBack) {
      report.at(place, 'formula/directive-name', {
        found: '":held-back" where no water is held back',
        expected: 'hold-back under water',
        advice: 'add it, or take the amount out of the text',
      });
    }
    return;
  }
  if (!names) return;
  const choices = names[list];
  const count = choices.get(label) ?? 0;
  if (count > 1) {
    report.at(place, 'formula/ambiguous-weight', {
      found: `":weight[${label}]", of which this formula has ${count} weights`,
      expected: 'a thing that is weighed once',
      advice: 'point to the table of weights in words instead',
    });
  } else if (count === 0 && !names.misspelt.has(label)) {
    report.at(place, 'formula/directive-name', {
      found: label === '' ? `":${name}" without a name` : `":${name}[${label}]"`,
      expected:
        choices.size > 0
          ? `one that this formula has: ${[...choices.keys()].join(', ')}`
          : `a formula that states a ${name} to print`,
      advice: didYouMean(label, [...choices.keys()], ''),
    });
  }
}
