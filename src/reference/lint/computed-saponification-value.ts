import { glycerideSaponificationValue, meanMolarMass } from '../../chemistry/fatty-acids.ts';
import type { LintCheck } from './check.ts';

/** How much wider than published the range is taken. [1] */
const WIDER = 0.02;

/**
 * The saponification value that follows from the composition used, against the range used. It is a
 * cross-check and replaces nothing. Waxes are left out: their alcohols are not in the composition.
 */
export const computedSaponificationValue: LintCheck = {
  name: 'computed-saponification-value',
  description:
    'The composition used gives a saponification value inside the range used, widened by 2 %.',
  check: ({ core, kind }, { constants }) => {
    if (!core?.composition || kind === 'wax') return [];
    const pure =
      kind === 'free-acid'
        ? (1000 * constants.hydroxide.K) / meanMolarMass(core.composition)
        : glycerideSaponificationValue(core.composition, constants);
    const computed = pure * (1 - core.unsaponifiable);
    const { low, high } = core.saponificationValue;
    if (computed >= low * (1 - WIDER) && computed <= high * (1 + WIDER)) return [];
    return [
      {
        path: ['compositions', 0],
        found: `a composition that gives ${computed.toFixed(1)} mg KOH/g`,
        expected: `${low} to ${high}, give or take 2 %`,
        advice: 'check composition and range, or write an exception with its reason',
      },
    ];
  },
};
