import { z } from 'zod';
import type { FormulaDocument } from './document.ts';

const number = z.number();
const pair = z.tuple([number, number]).readonly();
const numbers = z.record(z.string(), number).readonly();
const freshAndReleased = z.strictObject({ fresh: number, released: number }).readonly();
const list = <T extends z.ZodType>(item: T) => z.array(item).readonly();

const fatLine = z
  .strictObject({
    id: z.string(),
    blend: z.string().exactOptional(),
    mass: number,
    share: number,
    saponificationValue: z
      .strictObject({
        value: number,
        low: number,
        high: number,
        source: z.string(),
        lot: z.string().exactOptional(),
      })
      .readonly(),
  })
  .readonly();

const weighed = { id: z.string(), weighedMass: number, step: number };
const weighedLine = z.strictObject(weighed).readonly();
const weighedAt = z.strictObject({ ...weighed, at: z.string() }).readonly();
const breach = z.strictObject({ rule: z.string(), numbers }).readonly();

const batch = z
  .strictObject({
    id: z.string(),
    label: z.string(),
    digest: z.string().nullable(),
    fats: list(weighedLine),
    afterCookFats: list(weighedLine),
    alkali: list(z.strictObject({ ...weighed, solution: number.exactOptional() }).readonly()),
    weighedWater: number.nullable(),
    waterStep: number,
    weighedHeldBack: number.nullable(),
    heldBackStep: number,
    liquids: list(weighedAt),
    additives: list(weighedAt),
    massOfFats: number.nullable(),
    total: number.nullable(),
    superfat: z
      .strictObject({ weighed: number, expanded: pair, worstCase: pair })
      .readonly()
      .nullable(),
    bars: number.nullable(),
    yield: z
      .strictObject({ poured: number, releasedMass: number, soap: number })
      .readonly()
      .nullable(),
    refused: breach.nullable(),
  })
  .readonly();

const profile = z
  .strictObject({
    acids: numbers,
    saturated: number,
    monounsaturated: number,
    polyunsaturated: number,
    saponificationValue: number,
    iodineValue: number,
    oxidisability: number,
    bisAllylicPositions: number,
    meanChainLength: number,
    chainLengths: numbers,
    meanMolarMass: number,
  })
  .readonly();

const yields = z
  .strictObject({
    soap: number,
    glycerol: number,
    unsaponifiedFat: number,
    unsaponifiable: number,
    freeAlkali: number,
    water: number,
    carbonateAndInert: number,
    additives: number,
    total: number,
    totalFattyMatter: freshAndReleased,
    glycerolShare: freshAndReleased,
    releasedMass: number,
    moisture: freshAndReleased,
  })
  .readonly();

const concession = z
  .strictObject({ reason: z.string(), by: z.string(), on: z.string() })
  .readonly();

/** The shape of a formula document, for tests and for the JSON Schema that is published beside it. */
export const documentSchema: z.ZodType<FormulaDocument> = z
  .strictObject({
    schema: z.literal(1),
    code: z.string(),
    name: z.string(),
    kind: z.enum(['bar', 'paste', 'liquid']),
    process: z.enum(['cold', 'hot']),
    revision: number,
    fingerprint: z.string().nullable(),
    fats: list(fatLine),
    afterCookFats: list(fatLine),
    alkali: list(
      z
        .strictObject({
          id: z.string(),
          moles: number,
          pureMass: number,
          assay: z
            .strictObject({
              value: number,
              low: number,
              high: number,
              source: z.string().exactOptional(),
              lot: z.string().exactOptional(),
            })
            .readonly(),
          form: z.enum(['solid', 'solution']),
          weighedMass: number,
        })
        .readonly(),
    ),
    water: number,
    heldBack: number,
    liquids: list(
      z
        .strictObject({
          id: z.string(),
          at: z.string(),
          mass: number,
          water: number,
          fat: number,
          sugar: number,
        })
        .readonly(),
    ),
    additives: list(
      z
        .strictObject({ id: z.string(), at: z.string(), mass: number, percentOfFats: number })
        .readonly(),
    ),
    lye: z
      .strictObject({
        concentration: number,
        asMade: number,
        pureAsMade: number,
        peakTemperature: number.nullable(),
        peakTemperatureSpread: pair.nullable(),
        startTemperature: number,
        peakWithAllWater: number.nullable(),
        boilingPoint: number.nullable(),
        saturation: z
          .strictObject({ atStart: number.nullable(), atPeak: number.nullable() })
          .readonly(),
      })
      .readonly(),
    equivalents: z
      .strictObject({ saponifiable: number, acid: number, hydroxide: number })
      .readonly(),
    superfat: z
      .strictObject({
        written: number,
        expanded: pair,
        worstCase: pair,
        final: number,
        withoutLots: z.strictObject({ expanded: pair, worstCase: pair }).readonly().nullable(),
        ifAcidForgotten: number.nullable(),
        budget: list(z.strictObject({ id: z.string(), halfWidth: number }).readonly()),
      })
      .readonly(),
    release: z
      .strictObject({
        end: z.enum(['expanded', 'worst-case']),
        floor: number,
        lowest: number,
        batch: z.string().nullable(),
        met: z.boolean(),
        concession: concession.nullable(),
      })
      .readonly(),
    profile: profile.nullable(),
    yield: yields,
    schedule: z
      .strictObject({ cutFromDay: number.nullable(), releaseFromDay: number.nullable() })
      .readonly(),
    batches: list(batch),
    cautions: list(
      z
        .strictObject({
          id: z.string(),
          severity: z.enum(['danger', 'warning', 'care', 'note']),
          numbers: z.record(z.string(), z.union([number, z.string()])).readonly(),
          text: z.string(),
          action: z.string(),
          basis: z.string(),
        })
        .readonly(),
    ),
    breaches: list(z.strictObject({ path: z.string(), rule: z.string(), numbers }).readonly()),
  })
  .readonly();

/** JSON Schema of a formula document, published beside the documents. */
export const documentJsonSchema = (): object => z.toJSONSchema(documentSchema);
