import type { CautionId } from '../words/en/cautions.ts';
import type { CautionRule } from './rule.ts';
import { rule as acidForgotten } from './rules/acid-forgotten.ts';
import { rule as afterCookFats } from './rules/after-cook-fats.ts';
import { rule as alcoholNearHeat } from './rules/alcohol-near-heat.ts';
import { rule as alkaliLotRetest } from './rules/alkali-lot-retest.ts';
import { rule as alkaliWithoutLot } from './rules/alkali-without-lot.ts';
import { rule as allergenSources } from './rules/allergen-sources.ts';
import { rule as batchAboveHeatLimit } from './rules/batch-above-heat-limit.ts';
import { rule as batchAboveVessel } from './rules/batch-above-vessel.ts';
import { rule as batchTooSmall } from './rules/batch-too-small.ts';
import { rule as castorShare } from './rules/castor-share.ts';
import { rule as concessionInForce } from './rules/concession-in-force.ts';
import { rule as fastTrace } from './rules/fast-trace.ts';
import { rule as fragranceAboveMaximum } from './rules/fragrance-above-maximum.ts';
import { rule as fragranceMaximumUnknown } from './rules/fragrance-maximum-unknown.ts';
import { rule as fragranceNearFlashPoint } from './rules/fragrance-near-flash-point.ts';
import { rule as fragranceSpeedsTrace } from './rules/fragrance-speeds-trace.ts';
import { rule as freeAcidSeizes } from './rules/free-acid-seizes.ts';
import { rule as freeAlkaliPossible } from './rules/free-alkali-possible.ts';
import { rule as hardAndBrittle } from './rules/hard-and-brittle.ts';
import { rule as heatsBatter } from './rules/heats-batter.ts';
import { rule as hotProcessBoilOver } from './rules/hot-process-boil-over.ts';
import { rule as lyeAndMetals } from './rules/lye-and-metals.ts';
import { rule as lyeHeatNearBoiling } from './rules/lye-heat-near-boiling.ts';
import { rule as lyeHeatUnknown } from './rules/lye-heat-unknown.ts';
import { rule as lyeHot } from './rules/lye-hot.ts';
import { rule as lyeNearSaturation } from './rules/lye-near-saturation.ts';
import { rule as lyeStrongerThanWritten } from './rules/lye-stronger-than-written.ts';
import { rule as oxidisesEarly } from './rules/oxidises-early.ts';
import { rule as potassiumLye } from './rules/potassium-lye.ts';
import { rule as rapeseedShare } from './rules/rapeseed-share.ts';
import { rule as reworkAboveCap } from './rules/rework-above-cap.ts';
import { rule as saltSetsFast } from './rules/salt-sets-fast.ts';
import { rule as slowTrace } from './rules/slow-trace.ts';
import { rule as stockCrystallises } from './rules/stock-crystallises.ts';
import { rule as stockLye } from './rules/stock-lye.ts';
import { rule as stripsSkin } from './rules/strips-skin.ts';
import { rule as superfatHigh } from './rules/superfat-high.ts';
import { rule as superfatMarginThin } from './rules/superfat-margin-thin.ts';
import { rule as waxInColdProcess } from './rules/wax-in-cold-process.ts';

/**
 * Every rule under its id. Rules of one severity keep this order on a page: what is done about it first
 * comes first, and what holds for every lye comes last among those that ask for care.
 */
export const RULES: { readonly [Id in CautionId]: CautionRule<Id> } = {
  'free-alkali-possible': freeAlkaliPossible,
  'acid-forgotten': acidForgotten,
  'lye-heat-near-boiling': lyeHeatNearBoiling,
  'lye-heat-unknown': lyeHeatUnknown,
  'alcohol-near-heat': alcoholNearHeat,
  'fragrance-near-flash-point': fragranceNearFlashPoint,
  'concession-in-force': concessionInForce,
  'superfat-margin-thin': superfatMarginThin,
  'after-cook-fats': afterCookFats,
  'wax-in-cold-process': waxInColdProcess,
  'hot-process-boil-over': hotProcessBoilOver,
  'lye-hot': lyeHot,
  'lye-stronger-than-written': lyeStrongerThanWritten,
  'lye-near-saturation': lyeNearSaturation,
  'potassium-lye': potassiumLye,
  'stock-lye': stockLye,
  'stock-crystallises': stockCrystallises,
  'batch-too-small': batchTooSmall,
  'batch-above-vessel': batchAboveVessel,
  'batch-above-heat-limit': batchAboveHeatLimit,
  'fragrance-above-maximum': fragranceAboveMaximum,
  'alkali-lot-retest': alkaliLotRetest,
  'alkali-without-lot': alkaliWithoutLot,
  'heats-batter': heatsBatter,
  'free-acid-seizes': freeAcidSeizes,
  'fragrance-speeds-trace': fragranceSpeedsTrace,
  'salt-sets-fast': saltSetsFast,
  'oxidises-early': oxidisesEarly,
  'rework-above-cap': reworkAboveCap,
  'rapeseed-share': rapeseedShare,
  'strips-skin': stripsSkin,
  'superfat-high': superfatHigh,
  'allergen-sources': allergenSources,
  'fragrance-maximum-unknown': fragranceMaximumUnknown,
  'lye-and-metals': lyeAndMetals,
  'fast-trace': fastTrace,
  'slow-trace': slowTrace,
  'castor-share': castorShare,
  'hard-and-brittle': hardAndBrittle,
};
