import { at, koh, minus, of, plus, times, v } from './equation-symbols.ts';
import { BATCH_EQUATIONS } from './equations-batch.ts';
import {
  brackets,
  display,
  equals,
  named,
  number,
  over,
  root,
  row,
  sign,
  squared,
  sub,
  sum,
} from './mathml.ts';

/** The equations of the methods page, by the id of the model. The words stand in `src/words`. */
export const EQUATIONS = {
  'molar-mass': [equals(v('M'), sum('k', row(at('n', 'k'), times, at('A', 'k'))))],
  equivalents: [
    equals(at('e', 'i'), over(at('S', 'i'), row(number(1000), times, koh))),
    equals(v('E'), sum('i', row(at('m', 'i'), times, at('e', 'i')))),
  ],
  alkali: [
    equals(
      of('n', 'OH'),
      row(v('E'), times, brackets(number(1), minus, v('s')), plus, of('n', 'acid')),
    ),
    equals(v('s'), row(number(1), minus, over(row(of('n', 'OH'), minus, of('n', 'acid')), v('E')))),
    equals(of('m', 'weighed'), over(row(of('n', 'OH'), times, of('M', 'alkali')), v('a'))),
  ],
  acids: [
    equals(of('n', 'acid'), sum('j', over(row(at('z', 'j'), times, at('m', 'j')), at('M', 'j')))),
  ],
  'mixed-lye': [
    equals(of('n', 'Na'), row(at('x', 'Na'), times, of('n', 'OH'))),
    equals(
      of('n', 'Na'),
      row(
        of('n', 'OH'),
        times,
        over(
          over(of('y', 'Na'), of('M', 'NaOH')),
          row(over(of('y', 'Na'), of('M', 'NaOH')), plus, over(of('y', 'K'), koh)),
        ),
      ),
    ),
  ],
  water: [
    equals(
      of('m', 'water'),
      row(of('m', 'alkali'), times, over(row(number(1), minus, v('c')), v('c'))),
    ),
    equals(of('m', 'water'), row(v('r'), times, of('m', 'alkali'))),
    equals(of('m', 'water'), row(v('p'), times, of('m', 'fats'))),
  ],
  margin: [
    equals(
      v('U'),
      row(
        number(2),
        root(
          sum(
            'q',
            squared(brackets(over(row(sign('∂'), v('s')), row(sign('∂'), v('q'))), at('u', 'q'))),
          ),
        ),
      ),
    ),
    equals(
      at('u', 'q'),
      over(row(at('q', 'high'), minus, at('q', 'low')), row(number(2), root(number(3)))),
    ),
    equals(
      of('s', 'worst'),
      row(
        number(1),
        minus,
        over(
          row(of('n', 'OH'), brackets(of('a', 'high')), minus, of('n', 'acid')),
          row(v('E'), brackets(of('S', 'low'))),
        ),
      ),
    ),
  ],
  profile: [
    equals(v('M'), over(number(1), sum('k', over(at('w', 'k'), at('M', 'k'))))),
    equals(v('F'), over(row(number(3), v('M')), row(number(3), v('M'), plus, number('38.049')))),
  ],
  'saponification-value': [
    equals(v('S'), sum('i', row(at('f', 'i'), times, at('S', 'i')))),
    equals(
      of('S', 'computed'),
      over(row(number(3000), times, koh), row(number(3), v('M'), plus, number('38.049'))),
    ),
  ],
  'iodine-value': [equals(named('IV'), sum('k', row(at('P', 'k'), times, at('F', 'k'))))],
  oxidisability: [
    equals(
      named('COX'),
      over(
        row(
          named('18:1'),
          plus,
          number('10.3'),
          times,
          named('18:2'),
          plus,
          number('21.6'),
          times,
          named('18:3'),
        ),
        number(100),
      ),
    ),
  ],
  'bis-allylic': [equals(named('BAPE'), row(named('18:2'), plus, number(2), times, named('18:3')))],
  'chain-length': [
    equals(
      v('C'),
      over(
        sum('k', row(over(at('w', 'k'), at('M', 'k')), times, at('C', 'k'))),
        sum('k', over(at('w', 'k'), at('M', 'k'))),
      ),
    ),
  ],
  balance: [
    equals(
      of('m', 'in'),
      row(
        of('m', 'fats'),
        plus,
        of('m', 'alkali'),
        plus,
        of('m', 'water'),
        plus,
        of('m', 'additives'),
      ),
    ),
    equals(
      of('m', 'out'),
      row(
        of('m', 'soap'),
        plus,
        of('m', 'glycerol'),
        plus,
        of('m', 'unsaponified'),
        plus,
        of('m', 'unsaponifiable'),
        plus,
        of('m', 'rest'),
      ),
    ),
    equals(of('m', 'in'), of('m', 'out')),
    equals(
      named('TFM'),
      row(
        number(100),
        times,
        over(
          row(
            of('m', 'acids in soap'),
            plus,
            of('m', 'unsaponified'),
            plus,
            of('m', 'unsaponifiable'),
          ),
          of('m', 'total'),
        ),
      ),
    ),
  ],
  rounding: [],
  'lye-heat': [
    equals(
      v('T'),
      row(
        sub(v('T'), number(0)),
        plus,
        over(
          row(
            of('n', 'OH'),
            times,
            v('q'),
            brackets(v('r')),
            plus,
            of('n', 'acid'),
            times,
            number('55.8'),
          ),
          row(v('m'), times, v('c')),
        ),
      ),
    ),
  ],
  ...BATCH_EQUATIONS,
} as const satisfies Readonly<Record<string, readonly string[]>>;

export type ModelId = keyof typeof EQUATIONS;

/** The displayed equations of a model as MathML, none for a model that is a procedure. */
export const equationsOf = (id: ModelId): readonly string[] => EQUATIONS[id].map(display);
