import type { z } from 'zod';
import type { Constants } from '../chemistry/constants.ts';
import { iodineFactors } from '../chemistry/fatty-acids.ts';
import { type AtomicWeights, molarMass } from '../chemistry/molar-mass.ts';
import type { GramsPerMole } from '../chemistry/quantity.ts';
import type { AcidRecord } from './material-records.ts';
import type { DataReport } from './report.ts';
import type { acidsSchema } from './schema/chemicals.ts';
import { valueRecord } from './schema/value.ts';

/** The fatty acids by id, with molar masses from the atomic weights. */
export function acidRecords(
  raw: z.infer<typeof acidsSchema>,
  weights: AtomicWeights,
  constants: Constants,
  report: DataReport,
): Map<string, AcidRecord> {
  const acids = new Map<string, AcidRecord>();
  for (const [id, entry] of Object.entries(raw)) {
    const { carbons, hydroxyls, formula } = entry;
    const doubleBonds = entry['double-bonds'];
    const expected = formulaOf(carbons, doubleBonds, hydroxyls);
    const name = `C${carbons}:${doubleBonds}${hydroxyls > 0 ? '-OH' : ''}`;
    if (formula !== expected || id !== name) {
      report.in([id, 'formula'], 'data/acid-form', {
        found: `${id} with formula ${formula}`,
        expected: `${name} with formula ${expected}`,
        advice: 'id, formula, carbons, double bonds and hydroxyls must tell the same',
      });
      continue;
    }
    const mass = molarMassIn(formula, weights, [id, 'formula'], report);
    if (mass === null) continue;
    const factor = entry['iodine-factor'];
    acids.set(id, {
      acid: {
        id,
        carbons,
        doubleBonds,
        hydroxyls,
        molarMass: mass,
        iodineFactor: factor
          ? { glyceride: factor.glyceride, acid: factor.acid }
          : iodineFactors(mass, doubleBonds, constants),
      },
      name: entry.name,
      systematicName: entry['systematic-name'],
      formula,
      iodineFactor: factor
        ? valueRecord({
            ...factor,
            value: factor.glyceride,
            unit: 'g I2/100 g',
            note: factor.note ?? `of the free acid ${factor.acid}`,
          })
        : null,
      meltingPoint: entry['melting-point'] ? valueRecord(entry['melting-point']) : null,
    });
  }
  return acids;
}

/** Straight chain with one carboxyl group: two hydrogens less per double bond, one oxygen more per hydroxyl. */
const formulaOf = (carbons: number, doubleBonds: number, hydroxyls: number) =>
  `C${carbons}H${2 * (carbons - doubleBonds)}O${2 + hydroxyls}`;

/** Molar mass of a formula in the data, or a problem at its place. [g/mol] */
export function molarMassIn(
  formula: string,
  weights: AtomicWeights,
  path: readonly PropertyKey[],
  report: DataReport,
): GramsPerMole | null {
  try {
    return molarMass(formula, weights);
  } catch (error) {
    if (!(error instanceof RangeError)) throw error;
    report.in(path, 'data/molecular-formula', {
      found: `formula "${formula}"`,
      expected: `symbols of ${[...weights.keys()].join(', ')} with counts`,
      advice: 'mend the formula, or add the element to data/elements.yaml',
    });
    return null;
  }
}
