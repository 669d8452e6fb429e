import { readdirSync, readFileSync } from 'node:fs';
import { join, posix } from 'node:path';
import { describe, expect, inject, test } from 'vitest';
import { readMeasure } from '../../src/reference/schema/measure.ts';
import { english } from '../../src/words/en.ts';
import { spanish } from '../../src/words/es.ts';
import { OUNCE } from '../../src/words/units.ts';
import { siteFiles, sitePages } from '../support/site-files.ts';
import { phrasesOf } from './phrases.ts';
import { visibleTexts } from './visible-texts.ts';

const site = inject('site');
const read = (path: string) => readFileSync(join(site, path), 'utf8');
const pages = sitePages(site);
const texts = new Map(pages.map((path) => [path, visibleTexts(read(path))]));
const documents = readdirSync(join(site, 'data/formulas')).map((name) =>
  JSON.parse(read(`data/formulas/${name}`)),
);

/** What a formula weighs by, or what is bought or found by weight. */
const WEIGHED = /^(index|shopping|find|formulas\/.*|sheets\/.*|lye\/(?!fats).*)\.html$/;
/** A test method, and the link to a table of ratios. */
const RATIOS = [spanish.sheetWords.release.phMethod, spanish.lyePage.fats.link].map((text) =>
  text.replaceAll('\u00a0', ' '),
);
const METRIC = /(?<![\p{L}\d/])\d[\d.,]*\s?(?:g|kg|mL|L)(?![\p{L}/])|°C/u;

test('an edition of three formulas of the other shop, in its language and units', () => {
  expect(documents.map(({ code }) => code)).toEqual(['TC-101', 'TC-102', 'TC-201']);
  expect(pages.length).toBeGreaterThan(100);
  const heads = new Set(
    pages.map((path) =>
      /<html [^>]*>/.exec(read(path))?.[0].replace(/ data-root="[^"]*"| class="[^"]*"/g, ''),
    ),
  );
  expect([...heads]).toEqual(['<html lang="es" data-locale="es-US" data-units="us">']);
});

test('nothing of the demo shop is in it', () => {
  const lots = readFileSync('data/lots.yaml', 'utf8').matchAll(/\blot: ([A-Z]{2}-\w+)/g);
  const demo = readdirSync('formulas').flatMap((name) => {
    const title = /^name: (.*)$/m.exec(
      name.endsWith('.md') ? readFileSync(join('formulas', name), 'utf8') : '',
    )?.[1];
    return title ? [title] : [];
  });
  const shop = readFileSync('data/shop.yaml', 'utf8');
  const own = [...shop.matchAll(/^name: (.*)$/gm), ...shop.matchAll(/label: ([^,}]*)/g)];
  const words = [...new Set([...lots, ...own].map(([, word = '']) => word.trim()).concat(demo))];
  expect(words.length).toBeGreaterThan(50);
  const short = new RegExp(
    `QY-\\d|\\b(?:${words.map((word) => word.replace(/[.*+?^${}()|[\]\\]/g, '\\$&')).join('|')})\\b`,
  );
  const found = siteFiles(site)
    .filter((path) => /\.(html|js|json|csv|svg|txt)$/.test(path))
    .flatMap((path) => {
      const hit = short.exec(read(path));
      return hit ? [`${path}: ${hit[0]}`] : [];
    });
  expect(found).toEqual([]);
});

test('no phrase of the English words is on a page or in a script of one', () => {
  const own = phrasesOf(spanish);
  const foreign = [...phrasesOf(english)].filter((phrase) => !own.has(phrase));
  expect(foreign.length).toBeGreaterThan(800);
  const found = new Set<string>();
  for (const [path, all] of texts) {
    const page = all.join('\n');
    for (const phrase of foreign) if (page.includes(phrase)) found.add(`${path}: ${phrase}`);
  }
  for (const path of siteFiles(site).filter((each) => /^assets\/.*\.js$/.test(each))) {
    const script = read(path);
    for (const phrase of foreign) if (script.includes(phrase)) found.add(`${path}: ${phrase}`);
  }
  expect([...found]).toEqual([]);
});

describe('where something is weighed', () => {
  test('no page shows grams, litres or degrees Celsius', () => {
    const found: string[] = [];
    for (const [path, all] of texts) {
      if (!WEIGHED.test(path)) continue;
      for (const text of all) {
        if (METRIC.test(text) && !RATIOS.includes(text)) found.push(`${path}: ${text}`);
      }
    }
    expect(found).toEqual([]);
  });

  test('every weight of the data stands on its sheet in pounds and ounces', () => {
    let count = 0;
    for (const { code, batches } of documents) {
      for (const batch of batches) {
        if (batch.refused) continue;
        const html = read(`sheets/${code}-${batch.id}.html`);
        for (const { id, weighedMass, step } of [...batch.fats, ...batch.alkali]) {
          const row = new RegExp(`<tr data-material="${id}">.*?</tr>`, 's').exec(html)?.[0] ?? '';
          const shown = /<td class="n">(.*?)<\/td>/s.exec(row)?.[1] ?? '';
          const text = shown
            .replace(/<[^>]*>/g, '')
            .replace(/&nbsp;|\s+/g, ' ')
            .replace(/ +/g, ' ')
            .trim();
          expect(text).toMatch(/^\d+ lb (\d|1[0-5])(\.\d+)? oz$/);
          const mass = readMeasure('mass', text)?.value ?? Number.NaN;
          expect(mass, `${code} ${batch.id} ${id}`).toBeCloseTo(weighedMass, 8);
          expect((weighedMass / step) % 1).toBeCloseTo(Math.round((weighedMass / step) % 1), 6);
          expect(step / OUNCE).toBeCloseTo(Number((step / OUNCE).toFixed(2)), 9);
          count++;
        }
      }
    }
    expect(count).toBeGreaterThan(15);
  });

  test('tables for machines have grams by name, and what is printed beside it', () => {
    const [head = '', ...rows] = read('data/lye-prueba.csv').trimEnd().split('\r\n');
    const columns = head.split(',');
    for (const row of rows.map((line) => line.split(','))) {
      const of = (name: string) => row[columns.indexOf(name)] ?? '';
      const printed = readMeasure('mass', of('as_printed'))?.value ?? Number.NaN;
      expect(printed).toBeCloseTo(Number(of('weighed_mass_g')), 8);
    }
    expect(rows.length).toBeGreaterThan(5);
  });
});

test('its own fat, its own source, and its own emergency text are on their pages', () => {
  const fat = texts.get('fats/tamarel.html')?.join('\n');
  expect(fat).toContain('Manteca de tamarel');
  expect(read('fats/tamarel.html')).toContain('Ficha técnica de la manteca de tamarel');
  expect(texts.get('safety.html')?.join('\n')).toContain('Timbre rojo');
  expect(texts.get('sheets/TC-101-prueba.html')?.join('\n')).toContain('Timbre rojo');
});

test('every link leads to a file and, within it, to a place', () => {
  const wrong: string[] = [];
  const ids = new Map<string, ReadonlySet<string>>();
  const idsOf = (path: string) => {
    const known =
      ids.get(path) ?? new Set([...read(path).matchAll(/ id="([^"]*)"/g)].map(([, id = '']) => id));
    ids.set(path, known);
    return known;
  };
  const files = new Set(siteFiles(site));
  for (const path of pages) {
    for (const [, href = ''] of read(path).matchAll(/<a [^>]*href="([^"]*)"/g)) {
      if (/^[a-z]+:/.test(href)) continue;
      const [target = '', place = ''] = href.split('#');
      const file = target === '' ? path : posix.join(posix.dirname(path), target);
      // the address of the finder says what is asked for
      if (!files.has(file) || (place !== '' && !place.includes('=') && !idsOf(file).has(place))) {
        wrong.push(`${path}: ${href}`);
      }
    }
  }
  expect(wrong).toEqual([]);
});
