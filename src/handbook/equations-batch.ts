import { at, koh, minus, of, plus, times, v } from './equation-symbols.ts';
import {
  brackets,
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

const function_ = (name: string, ...body: string[]) => row(named(name), brackets(...body));
const relative = (index: string) => squared(brackets(over(of('u', index), v(index))));

/** Equations of the models about materials and batches, by the id of the model. */
export const BATCH_EQUATIONS = {
  choice: [
    equals(
      v('S'),
      function_(
        'min',
        over(row(of('S', 'low'), plus, of('S', 'high')), number(2)),
        sign(','),
        of('S', 'mean'),
      ),
    ),
  ],
  lots: [
    equals(
      v('a'),
      row(
        v('t'),
        minus,
        v('w'),
        times,
        over(row(number(2), of('M', 'hydroxide')), of('M', 'carbonate')),
      ),
    ),
  ],
  titration: [
    equals(
      v('S'),
      over(
        row(
          number('56.1'),
          times,
          v('c'),
          times,
          brackets(sub(v('V'), number(0)), minus, sub(v('V'), number(1))),
        ),
        v('m'),
      ),
    ),
    equals(
      of('u', 'S'),
      row(
        v('S'),
        root(
          row(
            over(
              row(number(2), squared(of('u', 'V'))),
              squared(brackets(sub(v('V'), number(0)), minus, sub(v('V'), number(1)))),
            ),
            plus,
            relative('m'),
            plus,
            relative('c'),
          ),
        ),
      ),
    ),
  ],
  'free-acids': [
    equals(of('n', 'esters'), row(of('n', 'OH'), minus, of('n', 'acid'), minus, of('n', 'acids'))),
    equals(of('n', 'glycerol'), over(of('n', 'esters'), number(3))),
  ],
  waxes: [
    equals(of('e', 'high'), over(v('S'), row(number(1000), times, koh))),
    equals(of('e', 'sure'), over(v('A'), row(number(1000), times, koh))),
  ],
  blends: [equals(at('m', 'j'), row(at('x', 'j'), times, at('m', 'b')))],
  'stock-lye': [
    equals(of('m', 'stock'), over(of('m', 'pure'), v('a'))),
    equals(
      of('m', 'extra'),
      row(of('m', 'all'), minus, brackets(of('m', 'stock'), minus, of('m', 'pure'))),
    ),
  ],
  'lye-limits': [
    equals(
      v('y'),
      row(
        sub(v('y'), number(0)),
        plus,
        brackets(v('x'), minus, sub(v('x'), number(0))),
        times,
        over(
          row(sub(v('y'), number(1)), minus, sub(v('y'), number(0))),
          row(sub(v('x'), number(1)), minus, sub(v('x'), number(0))),
        ),
      ),
    ),
  ],
  'batch-size': [
    equals(
      of('m', 'fats'),
      over(of('m', 'batter'), row(v('b'), times, brackets(number(1), minus, v('l')))),
    ),
    equals(of('m', 'batter'), row(v('N'), times, of('m', 'bar'))),
    equals(of('m', 'batter'), row(v('V'), times, v('d'))),
    equals(v('d'), over(sum('i', at('m', 'i')), sum('i', over(at('m', 'i'), at('d', 'i'))))),
  ],
  'after-cook': [
    equals(
      of('s', 'final'),
      row(
        number(1),
        minus,
        over(
          row(of('n', 'OH'), minus, of('n', 'acid'), minus, of('n', 'late')),
          row(v('E'), plus, of('E', 'late')),
        ),
      ),
    ),
  ],
  yields: [
    equals(of('m', 'released'), over(of('m', 'dry'), row(number(1), minus, v('f')))),
    equals(v('k'), row(sign('⌊'), over(of('m', 'poured'), of('m', 'bar')), sign('⌋'))),
  ],
  days: [equals(v('D'), row(sign('⌈'), over(v('t'), number(24)), sign('⌉')))],
  dilution: [
    equals(sub(v('c'), number(0)), over(of('m', 'soap'), of('m', 'paste'))),
    equals(
      of('m', 'add'),
      row(
        of('m', 'paste'),
        times,
        brackets(over(sub(v('c'), number(0)), sub(v('c'), number(1))), minus, number(1)),
      ),
    ),
  ],
  release: [row(of('s', 'low'), sign('≥'), of('s', 'floor'))],
} as const satisfies Readonly<Record<string, readonly string[]>>;
