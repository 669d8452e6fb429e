import type { Root } from 'mdast';
import { visit } from 'unist-util-visit';
import { hiddenPlaces } from '../../reference/hidden-places.ts';
import { type HiddenCharacter, hiddenCharacters } from '../../words/hidden-characters.ts';
import type { Report } from '../report.ts';
import { startOf } from './structure.ts';

/** A weight must not look other than it is: nothing in the file is invisible. */
export function checkCharacters(text: string, report: Report): void {
  for (const { place, name } of hiddenPlaces(text)) {
    report.at(place, 'formula/hidden-character', {
      found: `the invisible character ${name}`,
      expected: 'text that can be seen',
      advice: 'delete it and type the text around it again',
    });
  }
}

/** The same for what Markdown makes of `&#x202E;` and its like, which can be seen in the file alone. */
export function checkReferences(method: Root, body: string, report: Report): void {
  visit(method, (node) => {
    const { start, end } = node.position ?? {};
    // of what holds others only its own texts count
    const texts = [
      'value' in node ? node.value : '',
      'alt' in node ? (node.alt ?? '') : '',
      'url' in node ? node.url : '',
    ];
    const [hidden]: readonly (HiddenCharacter | undefined)[] = texts.flatMap(hiddenCharacters);
    if (!hidden || hiddenCharacters(body.slice(start?.offset, end?.offset)).length > 0) return;
    report.at(startOf(node), 'formula/hidden-character', {
      found: `a reference to the invisible character ${hidden.name}`,
      expected: 'text that can be seen',
      advice: 'take the reference out',
    });
  });
}
