import { didYouMean } from '../nearest.ts';
import type { LintCheck } from './check.ts';

/** Every acid of every composition has its molar mass in `data/acids.yaml`. */
export const unknownAcid: LintCheck = {
  name: 'unknown-acid',
  description: 'Every acid of a composition is in the list of fatty acids.',
  check: ({ compositions }, { acids }) =>
    compositions.flatMap(({ acids: shares }, index) =>
      shares
        .filter(({ acid }) => !acids.has(acid))
        .map(({ acid }) => ({
          path: ['compositions', index, 'acids', acid],
          found: `acid "${acid}"`,
          expected: 'an id from data/acids.yaml',
          advice: didYouMean(acid, acids.keys(), 'add it there first'),
        })),
    ),
};
