import type { BatchDocument, FormulaDocument } from '../../src/formulary/document.ts';
import { documentSchema } from '../../src/formulary/document-schema.ts';

/**
 * What no computed document may be, whatever it was computed from. The arithmetic here is bare and stands apart from
 * the core: masses, values and assays as the document gives them, molar masses by hand from the CIAAW's abridged weights.
 */
export function documentFaults(document: FormulaDocument): readonly string[] {
  return [
    ...oddNumbers(document, ''),
    ...negativeMasses(document),
    ...balanceFaults(document),
    ...document.batches.flatMap((batch) => batchFaults(document, batch)),
    ...releaseFaults(document),
    ...schemaFaults(document),
  ];
}

const MOLAR_MASS = {
  'sodium-hydroxide': 22.99 + 15.999 + 1.008,
  'potassium-hydroxide': 39.098 + 15.999 + 1.008,
};
const POTASSIUM = MOLAR_MASS['potassium-hydroxide'];

function oddNumbers(value: unknown, path: string): readonly string[] {
  if (typeof value === 'number') return Number.isFinite(value) ? [] : [`${path} is ${value}`];
  if (typeof value !== 'object' || value === null) return [];
  return Object.entries(value).flatMap(([key, inner]) => oddNumbers(inner, `${path}.${key}`));
}

function negativeMasses({ fats, afterCookFats, alkali, batches, ...rest }: FormulaDocument) {
  const masses: readonly (readonly [string, number | null])[] = [
    ...[...fats, ...afterCookFats].map(({ id, mass }) => [id, mass] as const),
    ...alkali.map(({ id, weighedMass }) => [id, weighedMass] as const),
    ...[...rest.liquids, ...rest.additives].map(({ id, mass }) => [id, mass] as const),
    ['water', rest.water],
    ['held back', rest.heldBack],
    ...batches.flatMap((batch) => [
      ...linesOf(batch).map(({ id, weighedMass }) => [`${batch.id} ${id}`, weighedMass] as const),
      [`${batch.id} water`, batch.weighedWater] as const,
      [`${batch.id} held back`, batch.weighedHeldBack] as const,
    ]),
  ];
  return masses.flatMap(([what, mass]) =>
    mass !== null && !(mass >= 0) ? [`${what} weighs ${mass}`] : [],
  );
}

const linesOf = ({ fats, afterCookFats, alkali, liquids, additives }: BatchDocument) => [
  ...fats,
  ...afterCookFats,
  ...alkali,
  ...liquids,
  ...additives,
];

function balanceFaults({ yield: given }: FormulaDocument): readonly string[] {
  const { soap, glycerol, unsaponifiedFat, unsaponifiable, freeAlkali, water } = given;
  const parts = {
    soap,
    glycerol,
    unsaponifiedFat,
    unsaponifiable,
    freeAlkali,
    water,
    carbonateAndInert: given.carbonateAndInert,
    additives: given.additives,
  };
  const sum = Object.values(parts).reduce((total, part) => total + part, 0);
  return [
    ...(Math.abs(sum - given.total) <= 1e-9 * given.total ? [] : [`${sum} is not ${given.total}`]),
    ...Object.entries(parts).flatMap(([name, mass]) =>
      mass >= -1e-9 ? [] : [`the yield has ${mass} of ${name}`],
    ),
  ];
}

function batchFaults(document: FormulaDocument, batch: BatchDocument): readonly string[] {
  const { superfat, refused } = batch;
  if (refused) return linesOf(batch).length === 0 ? [] : [`${batch.id} is refused and has weights`];
  if (!superfat) return [`${batch.id} has neither weights nor a reason`];
  const bare = bareSuperfat(document, batch);
  const faults: [boolean, string][] = [
    [superfat.weighed >= document.superfat.written - 1e-9, 'weighed below the superfat written'],
    [superfat.expanded[0] >= superfat.worstCase[0] - 1e-9, 'expanded below the worst case'],
    [superfat.worstCase[0] <= superfat.weighed + 1e-9, 'worst case above what is weighed'],
    [
      bare === null || Math.abs(bare - superfat.weighed) <= 1e-6,
      `superfat ${superfat.weighed} is ${bare} by hand`,
    ],
    ...linesOf(batch).map(({ id, weighedMass, step }): [boolean, string] => [
      step > 0 && Math.abs(weighedMass / step - Math.round(weighedMass / step)) < 1e-6,
      `${id} weighs ${weighedMass} on a step of ${step}`,
    ]),
    [(batch.total ?? 0) > 0, 'nothing weighs anything'],
  ];
  return faults.flatMap(([holds, what]) => (holds ? [] : [`${batch.id}: ${what}`]));
}

/** By the masses on the sheet; `null` where liquids, acids or blends would need more than bare arithmetic. */
function bareSuperfat(document: FormulaDocument, batch: BatchDocument): number | null {
  const plain = document.liquids.length === 0 && document.fats.every(({ blend }) => !blend);
  if (!plain || document.equivalents.acid !== 0) return null;
  const equivalents = batch.fats.reduce((sum, { id, weighedMass }) => {
    const fat = document.fats.find((line) => line.id === id);
    return sum + (weighedMass * (fat?.saponificationValue.value ?? 0)) / (1000 * POTASSIUM);
  }, 0);
  const hydroxide = batch.alkali.reduce((sum, { id, weighedMass }) => {
    const assay = document.alkali.find((line) => line.id === id)?.assay.value ?? 0;
    return sum + (weighedMass * assay) / 100 / MOLAR_MASS[id as keyof typeof MOLAR_MASS];
  }, 0);
  return 100 * (1 - hydroxide / equivalents);
}

/** The lowest end that the shop limits, over the formula and its batches, found again. */
function releaseFaults({ release, superfat, batches }: FormulaDocument): readonly string[] {
  const end = release.end === 'expanded' ? 'expanded' : 'worstCase';
  const lowest = Math.min(
    superfat[end][0],
    ...batches.flatMap((batch) => batch.superfat?.[end][0] ?? []),
  );
  const met = lowest >= release.floor;
  return lowest === release.lowest && met === release.met
    ? []
    : [`released at ${release.lowest}, which is ${lowest} against ${release.floor}`];
}

function schemaFaults(document: FormulaDocument): readonly string[] {
  const parsed = documentSchema.safeParse(document);
  return parsed.success
    ? []
    : parsed.error.issues.map(({ path, message }) => `${path}: ${message}`);
}
