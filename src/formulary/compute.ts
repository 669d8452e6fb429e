import { massBalance } from '../chemistry/balance.ts';
import type { Charge } from '../chemistry/charge.ts';
import { lyeOf } from '../chemistry/lye.ts';
import { lyeHeat } from '../chemistry/lye-heat.ts';
import { lyeBoilingPoint, saturationAt } from '../chemistry/lye-limits.ts';
import { type Margin, superfatMargin } from '../chemistry/margin.ts';
import { acidProfile } from '../chemistry/profile.ts';
import { type Celsius, celsius, fraction, grams } from '../chemistry/quantity.ts';
import { reckon } from '../chemistry/reckon.ts';
import {
  AS_USED,
  equivalentsOf,
  finalSuperfat,
  superfatIfAcidForgotten,
} from '../chemistry/superfat.ts';
import { yields } from '../chemistry/yields.ts';
import type { Reference } from '../reference/reference.ts';
import type { Problem } from '../words/problem.ts';
import { computeBatch } from './compute-batch.ts';
import { chargeProblems, missingProblem, refusalProblem, waxProblem } from './compute-problems.ts';
import type { FormulaDocument } from './document.ts';
import { alkaliLines, fatLine, profileDocument } from './document-lines.ts';
import type { Formula } from './formula.ts';
import type { ComputedFormula } from './formulary.ts';
import { prepareFormulation } from './formulation.ts';
import { marginWithoutLots } from './margin-without-lots.ts';
import { percentRange } from './percent-range.ts';
import { checkRelease } from './release.ts';
import { scheduleOf } from './schedule.ts';

/** What the document is reckoned on. [g] */
const MASS_OF_FATS = grams(1000);

/**
 * Everything that follows from one formula and the data in force. `computed` is null where an error leaves
 * no safe number; a breached release limit is not such an error and stands in the document.
 */
export function computeFormula(
  formula: Formula,
  reference: Reference,
): { readonly computed: ComputedFormula | null; readonly problems: readonly Problem[] } {
  const prepared = prepareFormulation(formula, reference);
  if (!prepared.ok) {
    return {
      computed: null,
      problems: prepared.missing.map((missing) => missingProblem(formula, missing)),
    };
  }
  const reckoned = reckon(prepared.formulation, MASS_OF_FATS, reference.constants);
  if (!reckoned.ok) {
    return { computed: null, problems: [refusalProblem(formula, reckoned.breach)] };
  }
  const charge = reckoned.value;
  const problems = chargeProblems(formula, charge, reference);
  if (problems.some(({ severity }) => severity === 'error')) return { computed: null, problems };
  const margin = superfatMargin(charge, reference.constants);
  if (!margin.ok) return { computed: null, problems: [...problems, waxProblem(formula)] };
  return {
    computed: { formula, charge, document: documentOf(formula, charge, margin.value, reference) },
    problems,
  };
}

function documentOf(
  formula: Formula,
  charge: Charge,
  margin: Margin,
  reference: Reference,
): FormulaDocument {
  const { constants, shop } = reference;
  const equivalents = equivalentsOf(charge, AS_USED, constants);
  const lye = lyeOf(charge);
  const start = celsius(shop.startTemperature);
  const lyeTables = reference.tables.lyeHeat;
  const heat = lyeHeat(charge, start, lyeTables, constants);
  const allWater = lyeHeat({ ...charge, heldBack: grams(0) }, start, lyeTables, constants);
  const saturation = (temperature: Celsius) => {
    const limit = saturationAt(charge, temperature, lyeTables);
    return limit === null ? null : limit * 100;
  };
  const profile = acidProfile([...charge.fats, ...charge.afterCookFats], constants);
  const balance = massBalance(charge, constants);
  const driedTo = formula.kind === 'bar' ? fraction(releaseMoisture(formula, reference)) : null;
  const given = yields(balance, driedTo);
  const batches = batchesOf(formula, reference).map((batch) =>
    computeBatch(charge, batch, driedTo, reference),
  );
  const superfat = {
    expanded: percentRange(margin.expanded),
    worstCase: percentRange(margin.worstCase),
  };
  const { acidsInSoap: _, ...masses } = balance;
  const percents = (pair: { readonly fresh: number; readonly released: number }) => ({
    fresh: pair.fresh * 100,
    released: pair.released * 100,
  });
  return {
    schema: 1,
    code: formula.code,
    name: formula.name,
    kind: formula.kind,
    process: formula.process,
    revision: formula.revision,
    fingerprint: null,
    fats: charge.fats.map((line) => fatLine(line, MASS_OF_FATS, reference)),
    afterCookFats: charge.afterCookFats.map((line) => fatLine(line, MASS_OF_FATS, reference)),
    alkali: alkaliLines(charge, reference),
    water: charge.water,
    heldBack: charge.heldBack,
    liquids: charge.liquids.map(({ liquid, mass, at }) => ({
      id: liquid.id,
      at,
      mass,
      water: mass * liquid.water,
      fat: mass * liquid.fat,
      sugar: mass * liquid.sugar,
    })),
    additives: charge.additives.map(({ additive, mass, at }) => ({
      id: additive.id,
      at,
      mass,
      percentOfFats: (100 * mass) / MASS_OF_FATS,
    })),
    lye: {
      concentration: lye.concentration * 100,
      asMade: lye.asMade * 100,
      pureAsMade: lye.pureAsMade * 100,
      peakTemperature: heat.ok ? heat.value.peak : null,
      peakTemperatureSpread: heat.ok ? [heat.value.coolest, heat.value.peak] : null,
      startTemperature: start,
      peakWithAllWater: charge.heldBack > 0 && allWater.ok ? allWater.value.peak : null,
      boilingPoint: lyeBoilingPoint(charge, lyeTables),
      saturation: {
        atStart: saturation(start),
        atPeak: heat.ok ? saturation(heat.value.peak) : null,
      },
    },
    equivalents,
    superfat: {
      written: formula.superfat,
      ...superfat,
      final: finalSuperfat(charge, constants) * 100,
      withoutLots: marginWithoutLots(formula, superfat, reference),
      ifAcidForgotten: equivalents.acid > 0 ? superfatIfAcidForgotten(equivalents) * 100 : null,
      budget: margin.budget.map(({ id, halfWidth }) => ({ id, halfWidth: halfWidth * 100 })),
    },
    release: checkRelease(formula, superfat, batches, shop.releaseLimits),
    profile: profile.ok ? profileDocument(profile.value) : null,
    yield: {
      ...masses,
      totalFattyMatter: percents(given.totalFattyMatter),
      glycerolShare: percents(given.glycerolShare),
      moisture: percents(given.moisture),
      releasedMass: given.releasedMass,
    },
    schedule: scheduleOf(formula),
    batches,
    cautions: [],
    breaches: [
      ...(heat.ok ? [] : [{ path: 'lye.peakTemperature', ...heat.breach }]),
      ...(profile.ok ? [] : [{ path: 'profile', ...profile.breach }]),
      ...batches.flatMap(({ refused }, i) =>
        refused ? [{ path: `batches.${i}`, ...refused }] : [],
      ),
    ],
  };
}

const releaseMoisture = (formula: Formula, { shop }: Reference) =>
  (formula.release.moisture ?? shop.releaseMoisture) / 100;

/** The formula's own list of batch sizes, in the shop's order, or all that suit its kind. */
function batchesOf({ batches, kind }: Formula, { shop }: Reference) {
  return shop.batches.filter(({ id, kinds }) =>
    batches ? batches.includes(id) : kinds.includes(kind),
  );
}
