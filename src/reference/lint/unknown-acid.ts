import type { LintCheck } from './check.ts';

/** Every acid of every composition has its molar mass in `data/acids.yaml`. */
export const unknownAcid: LintCheck = {
  name: 'unknown-acid',
  description: 'Every acid of a composition is in the list of fatty acids.',
  check: ({ compositions }, { acidIds }) =>
    compositions.flatMap(({ acids: shares }, index) =>
      shares
        .filter(({ acid }) => !acidIds.has(acid))
        .map(({ acid }) => ({
          path: ['compositions', index, 'acids', acid],
          found: `acid "${acid}"`,
          expected: 'an id from data/acids.yaml',
          advice: 'write carbons and double bonds as there, or add the acid there first',
        })),
    ),
};
