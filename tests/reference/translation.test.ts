import { readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import { parse } from 'yaml';
import type { z } from 'zod';
import { DATA_LANGUAGE, languageFile } from '../../src/reference/data-files.ts';
import { readEvidence } from '../../src/reference/evidence/read-evidence-fs.ts';
import { referenceFrom } from '../../src/reference/reference-from.ts';
import type { languageSchema } from '../../src/reference/schema/language.ts';
import { proseOf, withPhrases } from '../../src/reference/translation.ts';
import { LANGUAGES } from '../../src/words/languages.ts';
import { file, PACKAGED, packagedReference, textsOf, withChange } from './packaged-data.ts';

const inLocale = (locale: string) =>
  withChange('shop.yaml', 'name: Test shop', `name: Test shop\nlocale: ${locale}`);

function referenceIn(locale: string, own: readonly ReturnType<typeof file>[] = []) {
  const names = own.map(({ name }) => name);
  const files = [...inLocale(locale).filter(({ name }) => !names.includes(name)), ...own];
  const { reference, problems } = referenceFrom(files, 'data');
  if (!reference) throw new Error(textsOf({ problems }).join('\n'));
  return reference;
}

/** Every sentence of the packaged data that a page may show, the evidence among it. */
const prose = new Set(
  [
    ...PACKAGED.filter(
      ({ name }) => !/^(shop|lots|blends|searches|elements)\.yaml$|^languages\//.test(name),
    ).map(({ text }) => text),
    readFileSync('data/evidence.yaml', 'utf8'),
  ].flatMap((text) => proseOf(parse(text))),
);
const english = packagedReference();

describe.each(LANGUAGES.filter((language) => language !== DATA_LANGUAGE))('%s', (language) => {
  const text = readFileSync(`data/${languageFile(language)}`, 'utf8');
  const { phrases, ...sections } = parse(text) as z.infer<typeof languageSchema>;

  test('every packaged material has a name, and no other thing has', () => {
    const idsOf = (entries: ReadonlyMap<string, unknown>) => [...entries.keys()].sort();
    expect(
      Object.fromEntries(
        Object.entries(sections).map(([section, names]) => [section, Object.keys(names).sort()]),
      ),
    ).toEqual({
      fats: idsOf(english.fats),
      acids: idsOf(english.acids),
      'systematic-names': idsOf(english.acids),
      alkalis: idsOf(english.alkalis),
      additives: idsOf(english.additives),
      liquids: idsOf(english.liquids),
      'soap-grades': english.soapGrades.map(({ name }) => name).sort(),
    });
  });

  test('no two materials of a kind have one name', () => {
    for (const names of Object.values(sections)) {
      expect(new Set(Object.values(names)).size).toBe(Object.keys(names).length);
    }
  });

  test('every sentence of the packaged data has a translation, and no other has', () => {
    expect(Object.keys(phrases).sort()).toEqual([...prose].sort());
  });

  test.each(Object.entries(phrases))('%s', (original, translation) => {
    // numbers carry over, in their order; a decimal that is not in braces would keep a foreign sign
    const digits = (sentence: string) => sentence.match(/\d+(\.\d+)?/g) ?? [];
    expect(digits(translation)).toEqual(digits(original));
    expect(translation).not.toMatch(/\d,\d/);
  });
});

describe('a shop that speaks Spanish', () => {
  test('names and prose of the packaged data are Spanish', () => {
    const { fats, alkalis, cautionThresholds } = referenceIn('es-MX');
    expect(fats.get('olive')?.name).toBe('Aceite de oliva');
    expect(alkalis.get('sodium-hydroxide')?.name).toBe('Hidróxido de sodio');
    expect(cautionThresholds.limits['rapeseed-share-most'].because).toBe(
      'El extremo superior de la misma regla.',
    );
  });

  test('decimals in prose follow the locale, other numbers with a point stay', () => {
    const samples = { note: 'printed 285.3, exactly 285.35' };
    expect(withPhrases(samples, referenceIn('es-MX').phrases).note).toContain('285.3');
    expect(withPhrases(samples, referenceIn('es-ES').phrases).note).toContain('285,3;');
    expect(JSON.stringify(referenceIn('es-ES').phrases)).toContain('problema 8.83');
    expect(JSON.stringify(referenceIn('es-ES').phrases)).not.toMatch(/[{}]\d|\d[{}]/);
  });

  test('INCI names, places in sources and titles stay as published', () => {
    const spanish = referenceIn('es-ES');
    expect(spanish.sources).toEqual(english.sources);
    for (const [id, fat] of english.fats) {
      expect(spanish.fats.get(id)?.inci).toBe(fat.inci);
      expect(spanish.fats.get(id)?.compositions.map(({ at }) => at)).toEqual(
        fat.compositions.map(({ at }) => at),
      );
    }
  });

  test('all that is reckoned with is the same', () => {
    const spanish = referenceIn('es-ES');
    const cores = ({ fats, additives, liquids, alkalis, acids, constants }: typeof english) => ({
      materials: [fats, additives, liquids].map((map) => [...map.values()].map(({ core }) => core)),
      alkalis: [...alkalis.values()].map(({ trade }) => trade),
      acids: [...acids.values()].map(({ acid }) => acid),
      constants,
    });
    expect(cores(spanish)).toEqual(cores(english));
  });

  test('a file of the shop is taken as it stands', () => {
    const olive = PACKAGED.find(({ name }) => name === 'fats/olive.yaml');
    const own = {
      ...file('fats/olive.yaml', olive?.text.replace('Olive oil', 'Aceite del valle') ?? ''),
      packaged: false,
    };
    const trial = {
      ...file(
        'fats/trial.yaml',
        'name: Grasa de ensayo\ninci: Trial\nkind: glyceride\norigin: plant\n',
      ),
      packaged: false,
    };
    const { fats } = referenceIn('es-MX', [own, trial]);
    expect(fats.get('olive')?.name).toBe('Aceite del valle');
    expect(fats.get('olive')?.notes).toEqual(english.fats.get('olive')?.notes);
    expect(fats.get('trial')?.name).toBe('Grasa de ensayo');
    expect(fats.get('coconut')?.name).toBe('Aceite de coco');
  });

  test('what is read for a page in another language than the shop’s own follows the page', () => {
    const { reference } = referenceFrom(PACKAGED, 'data', 'es-MX');
    expect(reference?.fats.get('olive')?.name).toBe('Aceite de oliva');
  });

  test('the evidence is told in Spanish and computes the same', () => {
    const spanish = readEvidence('data', referenceIn('es-ES'));
    const { rows } = readEvidence('data', english);
    expect(textsOf(spanish)).toEqual([]);
    expect(spanish.rows.map(({ id, computed }) => [id, computed])).toEqual(
      rows.map(({ id, computed }) => [id, computed]),
    );
    expect(spanish.rows.map(({ subject }) => subject)).toContain(
      'Valoración por retroceso del ejemplo impreso',
    );
  });

  test('a problem of a packaged file keeps its place', () => {
    const spoil = (name: string) =>
      withChange('fats/olive.yaml', 'kind: glyceride', 'kind: glycerid').map((entry) =>
        entry.name === 'shop.yaml' ? file('shop.yaml', `${entry.text}locale: ${name}\n`) : entry,
      );
    const texts = (locale: string) => textsOf(referenceFrom(spoil(locale), 'data'));
    expect(texts('es-ES')).toEqual(texts('en-GB'));
  });
});
