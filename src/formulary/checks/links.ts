import type { Image, Root } from 'mdast';
import { visit } from 'unist-util-visit';
import type { Place } from '../../reference/yaml.ts';
import type { Report } from '../report.ts';
import { startOf } from './structure.ts';

/** A link from one formula to another, `[Harbour Lamp](formula:QY-014)`. */
export interface FormulaLink {
  readonly code: string;
  readonly place: Place;
}

const PICTURE = /^(?!.*\.\.)[A-Za-z0-9_][A-Za-z0-9_./-]*\.(png|jpe?g|webp)$/i;

/**
 * Links go to the web, to a mail address or to another formula; images are picture files of the folder
 * (`images`, relative to it), with a text for those who do not see them. Returns the links to formulas.
 */
export function checkLinks(
  method: Root,
  images: ReadonlySet<string>,
  report: Report,
): readonly FormulaLink[] {
  const links: FormulaLink[] = [];
  visit(method, (node) => {
    if (node.type === 'link' || node.type === 'definition') {
      const place = startOf(node);
      if (node.url.startsWith('formula:')) {
        links.push({ code: node.url.slice('formula:'.length), place });
      } else if (!isOutside(node.url)) {
        report.at(place, 'formula/link-target', {
          found: `a link to "${node.url}"`,
          expected: 'https://, http://, mailto: or formula: and a code',
          advice: 'link to another formula as [its name](formula:QY-014)',
        });
      }
    } else if (node.type === 'image') {
      checkImage(node, images, report);
    } else if (node.type === 'footnoteReference') {
      report.at(startOf(node), 'formula/link-target', {
        found: `the footnote "${node.identifier}"`,
        expected: 'what it says in the text itself',
        advice: 'a bench sheet has no foot where its reader looks',
      });
    } else if (node.type === 'imageReference') {
      report.at(startOf(node), 'formula/image-address', {
        found: 'an image by reference',
        expected: 'the file in the image itself',
        advice: 'write it as ![what it shows](picture.png)',
      });
    }
  });
  return links;
}

const isOutside = (url: string) => /^(https?:\/\/|mailto:)/i.test(url) && URL.canParse(url);

function checkImage(node: Image, images: ReadonlySet<string>, report: Report) {
  const place = startOf(node);
  if (!PICTURE.test(node.url)) {
    report.at(place, 'formula/image-address', {
      found: `the image "${node.url}"`,
      expected: 'a png, jpg or webp file in the folder of formulas, by its relative name',
      advice: 'copy the picture there; letters, digits, points and hyphens only',
    });
  } else if (!images.has(node.url)) {
    report.at(place, 'formula/image-missing', {
      found: `the image "${node.url}"`,
      expected: 'a file of this name in the folder of formulas',
      advice: 'capitals count',
    });
  } else {
    const twin = [...images].find(
      (name) => name !== node.url && name.toLowerCase() === node.url.toLowerCase(),
    );
    if (twin !== undefined) {
      report.at(place, 'formula/image-address', {
        found: `the image "${node.url}" beside "${twin}"`,
        expected: 'names that differ in more than capitals',
        advice: 'give one of the two another name; on many disks they are one file',
      });
    }
  }
  if ((node.alt ?? '').trim() === '') {
    report.at(place, 'formula/image-without-text', {
      found: `the image "${node.url}" without a text`,
      expected: 'what it shows, in a few words',
      advice: 'write it as ![what it shows](picture.png)',
    });
  }
}
