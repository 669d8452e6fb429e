import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { expect, inject, test } from 'vitest';
import { isKnown, lacking, OLDEST } from '../support/browser-support.ts';
import { PAGES_OF_KINDS } from '../support/page-kinds.ts';
import { siteFiles } from '../support/site-files.ts';
import { featuresOfScript } from './features-of-scripts.ts';
import { featuresOfStyles } from './features-of-styles.ts';

const site = inject('site');
const read = (path: string) => readFileSync(join(site, path), 'utf8');
const files = (end: string) => siteFiles(site).filter((path) => path.endsWith(end));

const HEADS = 'the document to print has no running heads; its cover names the edition';
const SIZE = 'prints on the paper that the printer has, upright';
const STRIPS = 'strips out of sight are drawn too';
const BREAKS = 'a long title breaks where its line is full';

/** What is newer than the oldest browsers on the list, and what a reader with one of those has instead. */
const WITHOUT: Readonly<Record<string, string>> = {
  'css.at-rules.page': 'paper has the margins that the browser gives it',
  'css.at-rules.page.at_bottom-left': HEADS,
  'css.at-rules.page.at_bottom-right': HEADS,
  'css.at-rules.page.at_top-left': HEADS,
  'css.at-rules.page.at_top-right': HEADS,
  'css.at-rules.page.size': SIZE,
  'css.at-rules.page.size.landscape': SIZE,
  'css.at-rules.page.size.portrait': SIZE,
  'css.properties.break-after.avoid': 'a heading may stand last on a sheet of paper',
  'css.properties.content-visibility': STRIPS,
  'css.properties.content-visibility.auto': STRIPS,
  'css.properties.cursor.crosshair': 'a telephone has no pointer',
  'css.properties.cursor.pointer': 'a telephone has no pointer',
  'css.properties.text-size-adjust': 'a telephone held across may enlarge text by itself',
  'css.properties.text-wrap': BREAKS,
  'css.properties.text-wrap.balance': BREAKS,
  'css.selectors.has':
    'safety and shopping pages print as other pages do, with the head of the handbook',
  'html.elements.search': 'the form is no landmark of its own; its fields have their names',
  'html.global_attributes.autocapitalize': 'a desktop has no keyboard that capitalises',
  'javascript.builtins.Intl.Segmenter':
    'words are taken apart letter by letter, each with its marks',
};

type Way = readonly string[];

/** The newer ones among features, each by its way. */
function newer(ways: readonly Way[]): readonly string[] {
  const unique = new Map(ways.map((way) => [way.join('.'), way]));
  return [...unique].filter(([, way]) => lacking(way).length > 0).map(([name]) => name);
}

const styles = files('.css').flatMap((path) => featuresOfStyles(read(path)));
const scripts = files('.js')
  .filter((path) => path.startsWith('assets/'))
  .flatMap((path) => featuresOfScript(read(path)));

test('styles, scripts and elements are there in the oldest browsers, or it is known what happens without', () => {
  const found = [...newer(styles), ...newer(scripts), ...newer(elements())].sort();
  expect(found).toEqual(Object.keys(WITHOUT).sort());
});

test('the look at them is no glance aside', () => {
  const unknown = styles.filter((way) => !isKnown(way)).map((way) => way.join('.'));
  expect([...new Set(unknown)]).toEqual([]);
  expect(styles.length).toBeGreaterThan(1000);
  expect(scripts.length).toBeGreaterThan(500);
  expect(newer(featuresOfStyles('a { b: c; &:has(d) { text-wrap: pretty } }')).length).toBe(4);
  expect(newer(featuresOfScript('Object.groupBy(a, b); c.values().map(d)')).length).toBe(2);
});

test('the list stands in DEVELOPERS.md', () => {
  const developers = readFileSync(
    fileURLToPath(new URL('../../DEVELOPERS.md', import.meta.url)),
    'utf8',
  );
  expect(developers).toContain(
    `Chromium ${OLDEST.chrome}, Firefox ${OLDEST.firefox} and Safari ${OLDEST.safari}`,
  );
});

function elements(): readonly Way[] {
  return PAGES_OF_KINDS.flatMap((path) =>
    [...read(path).matchAll(/<([a-z][a-z0-9]*)((?:\s+[a-z-]+(?:="[^"]*")?)*)/g)].flatMap(
      ([, tag = '', attributes = '']) => [
        ['html', 'elements', tag],
        ...[...attributes.matchAll(/\s([a-z-]+)(?:="[^"]*")?/g)].map(([, name = '']) =>
          isKnown(['html', 'elements', tag, name])
            ? ['html', 'elements', tag, name]
            : ['html', 'global_attributes', name],
        ),
      ],
    ),
  );
}
