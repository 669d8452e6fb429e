import type { Page } from '../../src/search/build/index-pages.ts';
import { type Chance, chance } from '../support/chance.ts';

const ROOTS =
  'soap olive coconut lye water batch mould cure trace superfat glycerol alkali weigh shea castor lard tallow fat bar paste liquid kettle temper salt clay oat honey milk yoghurt rosemary lavender citric lactate batter stir melt gel slab cut stamp harbour lamp bell rope jetty quay lantern goat linen chalk barge slip oxide carbon linole palmit stear ricinole titrate phenol sheet scale danger caution glove goggle'.split(
    ' ',
  );
const ENDINGS = ['', 's', 'ed', 'ing', 'er', 'ation', 'ness', 'ly', 'able', 'ies', 'ment', 'ful'];
const ODD =
  'café cafe crème Ångström señal jalapeño naïve über Zürich résumé パン ガス ソープ мыло σαπούνι صابون 肥皂 🧼 🫧 hello-world QY-013 qy-014 C18:1 C18:1-OH 37.5 1,250 NaOH WKWebView lye/water maker’s don’t it’s user_name <b>bold</b> a b I x2 3rd yyy sky news lying dying skis interment inter proceed exceed generously arsenic communism'.split(
    ' ',
  );

/** Words of the invented texts, common ones first. */
export const WORDS: readonly string[] = [
  ...ROOTS,
  ...ENDINGS.flatMap((ending) => ROOTS.map((root) => root + ending)),
  ...ODD,
  ...ROOTS.flatMap((root, i) => ROOTS.slice(i, i + 4).map((other) => root + other)),
];

/** Invented pages with headings, weights, metadata, sort keys and letters of several scripts. */
export function syntheticPages(count: number, seed: number): readonly Page[] {
  const random = chance(seed);
  return Array.from({ length: count }, (_, i) => {
    const code = `QY-${String(i).padStart(4, '0')}`;
    // a seventh has no number, so that not every page can be sorted by it
    const number =
      i % 7 === 6 ? '' : `<i data-pagefind-sort="number:${((i * 37) % 101) - 20.5}"></i>`;
    const kind = ['bar', 'liquid', 'paste'][i % 3];
    const paragraphs = Array.from({ length: 2 + random.below(4) }, () => sentence(random, 20, 60));
    return {
      path: `formulas/${code}.html`,
      html: `<!doctype html><html lang="en"><head><title>x</title></head><body>
        <main data-pagefind-body data-pagefind-filter="page:${i % 5 === 4 ? 'methods' : 'formulas'}">
        <header data-pagefind-filter="kind[data-kind], process[data-process]" data-kind="${kind}"
          data-process="${i % 2 ? 'hot' : 'cold'}" data-pagefind-sort="revision:${i % 9}">${number}</header>
        <h1>${escaped(sentence(random, 1, 4))}</h1>
        <p data-pagefind-meta="code" data-pagefind-sort="code" data-pagefind-weight="8">${code}</p>
        <ul data-pagefind-weight="${random.pick(['2', '4', '0.5'])}">${escaped(sentence(random, 2, 6))}</ul>
        ${paragraphs.map((text) => `<h2>${escaped(sentence(random, 1, 3))}</h2><p>${escaped(text)}</p>`).join('\n')}
        </main><footer>left out</footer></body></html>`,
    };
  });
}

/** Queries of every kind that people type, and some that nobody does. */
export function syntheticQueries(count: number, seed: number): readonly string[] {
  const random = chance(seed);
  const word = () => random.pickEarly(WORDS);
  const kinds: readonly (() => string)[] = [
    word,
    () => random.pick(ODD),
    () => beginning(word(), random),
    () => `${word()} ${beginning(word(), random)}`,
    () => `${word()} ${word()} ${word()}`,
    () => `${word()}${random.pick(['zz', 's', 'ing', 'é'])}`,
    () => `"${word()} ${word()}"`,
    () => `"${word()}"`,
    () => ` "${sentence(random, 2, 4)}" `,
    () => `${word().toUpperCase()}! (${word()})`,
    () => `QY-${String(random.below(300)).padStart(4, '0')}`,
    () => random.pick(ODD).normalize('NFD'),
    () => `${random.pick(ODD)} ${random.pick(ODD)}`,
    () => `${word()} qqqq`,
    () => `${word()}\ud800`,
    () => `${word()}\t${word()}\u0000`,
  ];
  return Array.from({ length: count }, (_, i) => (kinds[i % kinds.length] ?? word)());
}

const beginning = (word: string, random: Chance) =>
  [...word].slice(0, 1 + random.below([...word].length)).join('');

function sentence(random: Chance, least: number, most: number): string {
  const length = least + random.below(most - least + 1);
  return Array.from({ length }, () =>
    random.below(12) === 0 ? random.pick(ODD) : random.pickEarly(WORDS),
  ).join(' ');
}

const escaped = (text: string) => text.replaceAll('&', '&amp;').replaceAll('<', '&lt;');
