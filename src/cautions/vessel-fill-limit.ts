import type { CautionThresholds } from '../reference/caution-thresholds.ts';

/** How full a vessel may be made: less where the soap can rise in the cook. [percent] */
export const vesselFillLimit = (
  process: 'cold' | 'hot',
  { limits }: Pick<CautionThresholds, 'limits'>,
): number => limits[process === 'hot' ? 'vessel-fill-hot' : 'vessel-fill-cold'].value;
