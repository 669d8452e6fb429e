import type { CardContent, CardLine } from '../../src/handbook/card-content.ts';
import type { CardDrawing, Placed } from '../../src/handbook/card-drawing.ts';

/** All names and numbers are invented. */
export const CARD: CardContent = {
  code: 'TT-001',
  name: 'Test Bar',
  label: 'Pilot',
  proof: null,
  groups: [
    {
      title: 'Lye',
      lines: [
        { name: 'Sodium hydroxide', whole: '139', rest: '.7' },
        { name: 'Water', whole: '300', rest: '' },
      ],
    },
    { title: 'Fats', lines: [{ name: 'Olive oil', whole: '1000', rest: '' }] },
  ],
  decimals: 2,
  unit: 'g',
  notes: [],
  cautions: [
    { word: 'Danger', text: 'It is hot.', action: 'Wait.' },
    { word: 'Care', text: 'It is slow.', action: 'Wait longer.' },
  ],
  dangers: 1,
  moreCautions: 0,
  foot: ['Revision 2, as of 2026-12-01', 'formula 0000, weights 1111'],
  address: null,
};

const LONG =
  'a name that goes on and on because nobody told the person who wrote it to stop, '.repeat(2);
const UNBROKEN = 'Hydroxyoctadecenoylmethylpropanolamidostearyl'.repeat(3);

const fats = (count: number, name: (index: number) => string): readonly CardLine[] =>
  Array.from({ length: count }, (_, index) => ({
    name: name(index),
    whole: String(1000 + index),
    rest: index % 2 === 0 ? '.25' : '',
  }));

const sentences = (count: number) =>
  Array.from({ length: count }, (_, index) => ({
    word: 'Danger',
    text: `${LONG}${index}`,
    action: `${UNBROKEN} ${LONG}`,
  }));

/** What a card must bear without one thing lying on another. */
export const HOSTILE: Readonly<Record<string, CardContent>> = {
  'a formula with a long name': {
    ...CARD,
    name: LONG,
    label: 'Block mould of the back room, large',
  },
  'a name without a space': { ...CARD, name: UNBROKEN, code: 'ABCDEFGH-0001' },
  'materials with long names': {
    ...CARD,
    groups: [{ title: 'Fats', lines: fats(6, (index) => `${index} ${LONG}`) }],
  },
  'materials without spaces': {
    ...CARD,
    groups: [{ title: 'Fats', lines: fats(6, (index) => `${index}${UNBROKEN}`) }],
  },
  'thirty fats': {
    ...CARD,
    groups: [...CARD.groups, { title: 'At trace', lines: fats(30, (index) => `Oil ${index}`) }],
    address: 'https://example.org/handbook/formulas/TT-001.html',
  },
  'forty fats with long names': {
    ...CARD,
    groups: [{ title: 'Fats', lines: fats(40, (index) => `${index} ${LONG}`) }],
  },
  'five dangers at length': { ...CARD, cautions: sentences(5), dangers: 5, moreCautions: 12 },
  'a proof with all of it': {
    ...CARD,
    name: LONG,
    proof: 'Proof: changed since its approval. Not to work from.',
    groups: [{ title: 'Fats', lines: fats(30, (index) => `${index} ${LONG}`) }],
    cautions: sentences(3),
    dangers: 3,
    notes: [LONG],
    foot: [...CARD.foot, LONG],
    address: `https://example.org/${'folder/'.repeat(20)}formulas/TT-001.html`,
  },
  'letters of other scripts': {
    ...CARD,
    name: 'Łódź Ελλάδα Москва Việt',
    groups: [{ title: 'Fats', lines: fats(3, () => 'Масло, λάδι, dầu ô liu, øl') }],
  },
  'marks that are markup elsewhere': { ...CARD, name: '<b>&amp;"\'</b><script>' },
};

/** The pieces of text of a drawing with the boxes that they were given. */
export const textsOf = ({ placed }: CardDrawing): readonly (Placed & { readonly text: string })[] =>
  placed.flatMap((box) =>
    box.text === null || box.text === '' ? [] : [{ ...box, text: box.text }],
  );
