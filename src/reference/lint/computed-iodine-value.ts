import { freeAcidIodineValue, glycerideIodineValue } from '../../chemistry/fatty-acids.ts';
import type { LintCheck } from './check.ts';

/** The middles of wide ranges carry this far. [g I2/100 g] */
const WIDER = 5;

/** The iodine value that follows from the composition used, against the range used. Waxes are left out. */
export const computedIodineValue: LintCheck = {
  name: 'computed-iodine-value',
  description: 'The composition used gives an iodine value inside the range used, widened by 5.',
  check: ({ core, kind, chosen }) => {
    const range = chosen.iodineValue;
    if (!core?.composition || kind === 'wax' || range?.max == null) return [];
    const computed =
      kind === 'free-acid'
        ? freeAcidIodineValue(core.composition)
        : glycerideIodineValue(core.composition);
    const low = range.min ?? 0;
    if (computed >= low - WIDER && computed <= range.max + WIDER) return [];
    return [
      {
        path: ['compositions', 0],
        found: `a composition that gives ${computed.toFixed(1)} g I2/100 g`,
        expected: `${low} to ${range.max}, give or take ${WIDER}`,
        advice: 'check composition and range, or write an exception with its reason',
      },
    ];
  },
};
